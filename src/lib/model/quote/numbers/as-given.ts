import { isWrittenOut, leading, type QuotedNumber } from './quoted-number';
import { roundAt } from './round-at';

/** A number that was set and not measured, with the digits it was set with: "0.01", "1999", "5 × 10^−7". */
export function asGiven(value: number): QuotedNumber {
  if (value === 0) return { negative: false, digits: '0', power: null, value };
  const first = leading(value);
  const behind = value.toExponential().split('e')[0].replace(/\D/g, '').length - 1;
  const size = Math.abs(value);
  // Whole numbers are counts: they are told in full as long as they are exact.
  const out = isWrittenOut(size) || Number.isSafeInteger(value);
  return roundAt(value, out && first - behind > 0 ? 0 : first - behind, out ? null : first);
}
