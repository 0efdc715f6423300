/** A number as people read it, taken apart again without the code that wrote it. */
export interface Printed {
  value: number;
  /** One unit of its last digit. */
  unit: number;
  /** Significant digits. */
  digits: number;
}

const RAISED: Record<string, string> = { '⁻': '-', '⁰': '0', '¹': '1', '²': '2', '³': '3' };
'⁴⁵⁶⁷⁸⁹'.split('').forEach((sign, i) => (RAISED[sign] = String(i + 4)));

/** What a printed number looks like: "−1 234.5", "2.5 × 10⁻⁷". */
export const NUMBER = String.raw`\u2212?\d[\d\u2009\u202f ]*(?:\.\d+)?(?: × 10[⁻⁰¹²³⁴-⁹]+)?`;

export function printed(text: string): Printed {
  const [mantissa, power] = text.trim().split(' × 10');
  const plain = mantissa.replace('\u2212', '-').replace(/[\s\u2009\u202f]/g, '');
  if (!/^-?\d+(\.\d+)?$/.test(plain)) throw new Error(`"${text}" is no number`);
  const exponent = power === undefined ? 0 : Number([...power].map((sign) => RAISED[sign]).join(''));
  const places = plain.split('.')[1]?.length ?? 0;
  return {
    value: Number(`${plain}e${exponent}`),
    unit: Number(`1e${exponent - places}`),
    digits: plain.replace(/[-.]/g, '').replace(/^0+/, '').length
  };
}

/**
 * What is wrong with a printed number, '' when nothing is: it must be the value rounded to its own last digit, and have
 * at least `least` significant digits unless it is exact. A null is printed as a dash, or left empty.
 */
export function unlike(text: string, value: number | null, least: number): string {
  const said = text.trim();
  if (value === null) return said === '–' || said === '' ? '' : `"${said}" for nothing`;
  const { value: shown, unit, digits } = printed(said);
  // Half a unit, and what doubles lose when the two are subtracted.
  if (Math.abs(shown - value) > unit * (0.5 + 1e-6)) return `"${said}" for ${value}`;
  return digits >= least || shown === value ? '' : `"${said}" has too few digits of ${value}`;
}
