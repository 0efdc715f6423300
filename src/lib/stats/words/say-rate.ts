import { formatPercent } from './format-number';

/**
 * A misread rate as it was stated, in per cent: two significant digits, more where more were typed (four at most), so
 * that 0.499 does not read as one half, which no rate may be: "1.0 %", "49.9 %".
 */
export function sayRate(rate: number): string {
  const typed = Number((100 * rate).toPrecision(4));
  if (rate < 0.5 && typed >= 50) return `just under ${formatPercent(0.5)}`;
  const digits = typed === 0 ? 2 : typed.toExponential().split('e')[0].replace(/\D/g, '').length;
  return formatPercent(rate, Math.max(2, digits));
}
