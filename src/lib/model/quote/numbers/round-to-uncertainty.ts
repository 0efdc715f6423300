import type { Interval } from '$lib/stats/types';
import { isWrittenOut, leading, type QuotedNumber } from './quoted-number';
import { roundAt } from './round-at';
import { roundToDigits } from './round-to-digits';

/** A value and its limits, all rounded to the same decimal; a limit that is not there is null. */
export interface RoundedInterval {
  value: QuotedNumber;
  low: QuotedNumber | null;
  high: QuotedNumber | null;
}

/** Significant digits of a value that no interval tells how to round. */
const DIGITS_ALONE = 4;
/** A double holds fifteen decimal digits; beyond them stands only noise of the machine. */
const DIGITS_HELD = 15;

/**
 * Value and limits rounded to the uncertainty: half the width of the interval keeps two significant digits, and
 * value and limits are rounded, to nearest, to the decimal of the second.
 *
 * The usual rule of two digits for an expanded uncertainty, JCGM 100:2008 (GUM) 7.2.6, which knows no asymmetric
 * ones. An asymmetric interval has half of its whole width for this, and its shorter side where the other is more
 * than ten times as long (24.5 in 5 … 25 000 would else be 0); with one limit alone, or the value at the other, its
 * distance from the value. Without limits, or with limits equal to the value, the value keeps four digits. All three
 * share one power of ten, that of the value (of the farther limit when the value rounds to 0), from 1e9 on and under
 * 1e-4.
 *
 * A value closer to 0 than half a step is printed as 0 without a sign: the digits cannot carry it.
 *
 * @returns null when there is no value
 */
export function roundToUncertainty({ value, low, high }: Interval): RoundedInterval | null {
  if (value === null) return null;
  const half = halfWidth(value, low, high);
  const largest = Math.max(...[value, low, high].map((x) => Math.abs(x ?? 0)));
  if (largest === 0) {
    const zero = roundToDigits(0, 1);
    return { value: zero, low: low === null ? null : zero, high: high === null ? null : zero };
  }
  // The half-width is rounded first: 0.0996 is 0.10, whose second digit is the second decimal.
  const wanted =
    half > 0
      ? leading(Number(half.toExponential(1))) - 1
      : leading(Number((value || largest).toExponential(DIGITS_ALONE - 1))) - DIGITS_ALONE + 1;
  const exponent = Math.max(wanted, leading(largest) - DIGITS_HELD + 1);
  const power = isWrittenOut(largest) ? null : powerOf(value, largest, exponent);
  const at = (x: number | null) => (x === null ? null : roundAt(x, exponent, power));
  return { value: roundAt(value, exponent, power), low: at(low), high: at(high) };
}

/** Sides that differ more than this have no half-width in common. */
const LOPSIDED = 10;
/** A side shorter than this part of the other asks for no more digits. */
const SHORTEST = 1e-4;

function halfWidth(value: number, low: number | null, high: number | null): number {
  if (low !== null && high !== null) {
    const [shorter, longer] = [value - low, high - value].sort((a, b) => a - b);
    // A value at the very end of its interval has one side alone.
    if (shorter <= 0) return longer;
    const lopsided = longer > LOPSIDED * shorter;
    return lopsided ? Math.max(shorter, SHORTEST * longer) : (high - low) / 2;
  }
  if (high !== null) return high - value;
  return low === null ? 0 : value - low;
}

/** Exponent of the value once rounded, or of the largest where the value rounds to 0. */
function powerOf(value: number, largest: number, exponent: number): number {
  const rounded = (x: number) => leading(Number(`${roundAt(x, exponent).digits}`));
  const own = rounded(value);
  return Math.max(exponent, Number.isFinite(own) ? own : Math.max(exponent, rounded(largest)));
}
