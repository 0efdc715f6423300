/** Narrow no-break space in thousands, so that a number never breaks over a line. */
const thin = '\u202f';
const minus = '\u2212';
const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * A number as people read it: thin-space thousands, a real minus sign, `digits` significant digits, powers of
 * ten under 1e-4 and from 1e9 on ("2.5 × 10⁻⁷"). null gives "–".
 */
export function formatNumber(value: number | null, digits = 4): string {
  if (value === null || !Number.isFinite(value)) return '–';
  if (value === 0) return '0';
  const size = Math.abs(value);
  const sign = value < 0 ? minus : '';
  if (size < 1e-4 || size >= 1e9) return sign + power(size, digits);
  const places = Math.max(0, digits - 1 - Math.floor(Math.log10(size)));
  return sign + grouped(size.toFixed(Math.min(places, 12)));
}

/** A whole number with thin-space thousands. */
export function formatCount(value: number | null): string {
  if (value === null || !Number.isFinite(value)) return '–';
  return (value < 0 ? minus : '') + grouped(Math.abs(Math.round(value)).toString());
}

/** A share as per cent with two significant digits: "24 %". */
export function formatPercent(share: number | null, digits = 2): string {
  if (share === null || !Number.isFinite(share)) return '–';
  return `${formatNumber(100 * share, digits)}${thin}%`;
}

function power(size: number, digits: number): string {
  const [mantissa, exponent] = size.toExponential(digits - 1).split('e');
  const raised = [...exponent.replace('+', '')]
    .map((c) => (c === '-' ? '⁻' : superscripts[Number(c)]))
    .join('');
  return `${mantissa} × 10${raised}`;
}

function grouped(text: string): string {
  const [whole, part] = text.split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+$)/g, thin);
  return part === undefined ? spaced : `${spaced}.${part}`;
}
