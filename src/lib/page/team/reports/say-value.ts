import { formatCount, formatNumber } from '$lib/model/format-number';
import type { ComparedValue } from '$lib/model/compare/compared';

/** A compared value in words: "4.05 (4.03 to 4.07)"; a dash for none. Long texts are cut in the middle. */
export function sayValue(value: ComparedValue): string {
  if (value === null) return '–';
  if (typeof value === 'string')
    return value.length > 60 ? `${value.slice(0, 40)}…${value.slice(-8)}` : value;
  if (typeof value === 'number')
    return Number.isSafeInteger(value) ? formatCount(value) : formatNumber(value, 6);
  const [middle, low, high] = [value.value, value.low, value.high].map((one) =>
    one === null ? '–' : formatNumber(one, 4)
  );
  return value.low === null && value.high === null ? middle : `${middle} (${low} to ${high})`;
}
