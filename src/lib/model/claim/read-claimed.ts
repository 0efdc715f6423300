/** A number as typed from a manuscript. */
export interface Claimed {
  value: number;
  /** "< 0.001": only an upper limit is claimed. */
  below: boolean;
  /** One unit of the last digit given: 0.01 for 4.05, 1e-5 for 1.2e-4. */
  lastDigit: number;
}

/** Longest text that can be a number; longer ones are no number that anybody claims. */
const LONGEST = 60;

/**
 * Reads a number as it stands in print: a real minus sign, a decimal comma or point, thin spaces, "2.5 × 10⁻⁴",
 * "2.5e-4", "< 0.001". @returns null for anything else
 */
export function readClaimed(text: string): Claimed | null {
  if (text.length > LONGEST) return null;
  const plain = text
    .normalize('NFKC')
    .replace(/\s+/gu, '')
    .replace(/[−–]/g, '-')
    .replace(/[×·*x]10\^?\{?([+-]?\d+)\}?$/i, 'e$1');
  const found = /^([<≤]?)([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)(?:e([+-]?\d{1,3}))?$/i.exec(plain);
  if (!found) return null;
  const [, below, sign, digits, power = '0'] = found;
  const decimal = digits.replace(',', '.');
  const value = Number(`${sign}${decimal}e${power}`);
  if (!Number.isFinite(value)) return null;
  const places = decimal.includes('.') ? decimal.length - decimal.indexOf('.') - 1 : 0;
  return { value, below: below !== '', lastDigit: Number(`1e${Number(power) - places}`) };
}
