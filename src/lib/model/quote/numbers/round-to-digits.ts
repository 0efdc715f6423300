import { isWrittenOut, leading, type QuotedNumber } from './quoted-number';
import { roundAt } from './round-at';

/** A number at `digits` significant digits, for one whose uncertainty is not told: "0.00050", "2.5 × 10^−7". */
export function roundToDigits(value: number, digits: number): QuotedNumber {
  if (value === 0) return { negative: false, digits: '0', power: null, value };
  // Rounded first: 0.0999 at two digits is 0.10 and not 0.100.
  const first = leading(Number(value.toExponential(digits - 1)));
  return roundAt(value, first - digits + 1, isWrittenOut(Math.abs(value)) ? null : first);
}
