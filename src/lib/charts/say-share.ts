import { formatCount, formatNumber, formatPercent } from '$lib/model/format-number';

/** A share as people say it: percent, or "1 in so many" when it is small. 0 is said as 0. */
export function sayShare(value: number): string {
  if (value === 0) return '0';
  if (value >= 0.001) return formatPercent(value, value >= 0.1 ? 3 : 2);
  const often = 1 / value;
  return `1 in ${often < 1e9 ? formatCount(Number(often.toPrecision(2))) : formatNumber(often, 2)}`;
}
