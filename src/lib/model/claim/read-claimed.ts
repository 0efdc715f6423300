/** A number as typed from a manuscript. */
export interface Claimed {
  value: number;
  /** "< 0.001": only an upper limit is claimed. */
  below: boolean;
  /** One unit of the last digit given: 0.01 for 4.05, 1e-5 for 1.2e-4. */
  lastDigit: number;
  /** Uncertainty in brackets, 0.12 for "8.45(12)"; null for none. */
  bracketed: number | null;
  /** How "1,234" was read, which may have been meant as one thousand and more: "1.234". Null when nothing is in doubt. */
  readAs: string | null;
}

/** Longest text that can be a number; longer ones are no number that anybody claims. */
const LONGEST = 60;

/** A comma before just three digits may part thousands; after a leading 0 it cannot. */
const IN_DOUBT = /^[1-9]\d{0,2},\d{3}$/;

/**
 * Reads a number as it stands in print: a real minus sign, a decimal comma or point, thin spaces, "2.5 × 10⁻⁴",
 * "2.5e-4", "< 0.001", and with its uncertainty in units of the last digit, "8.45(12)" for 8.45 ± 0.12, or in full,
 * "8.4(1.2)". @returns null for anything else
 *
 * Source: GUM, JCGM 100:2008, 7.2.2, for uncertainties in brackets.
 */
export function readClaimed(text: string): Claimed | null {
  if (text.length > LONGEST) return null;
  const plain = text
    .normalize('NFKC')
    .replace(/\s+/gu, '')
    .replace(/[−–]/g, '-')
    .replace(/[×·*x]10\^?\{?([+-]?\d+)\}?$/i, 'e$1');
  const found =
    /^([<≤]?)([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)(?:\((\d+(?:[.,]\d+)?)\))?(?:e([+-]?\d{1,3}))?$/i.exec(plain);
  if (!found) return null;
  const [, below, sign, digits, brackets, power = '0'] = found;
  if (below !== '' && brackets !== undefined) return null;
  const decimal = digits.replace(',', '.');
  const value = Number(`${sign}${decimal}e${power}`);
  if (!Number.isFinite(value)) return null;
  const places = decimal.includes('.') ? decimal.length - decimal.indexOf('.') - 1 : 0;
  const bracketed =
    brackets === undefined
      ? null
      : /[.,]/.test(brackets)
        ? Number(`${brackets.replace(',', '.')}e${power}`)
        : Number(`${brackets}e${Number(power) - places}`);
  return {
    value,
    below: below !== '',
    lastDigit: Number(`1e${Number(power) - places}`),
    bracketed,
    readAs: IN_DOUBT.test(digits) ? sign + decimal : null
  };
}
