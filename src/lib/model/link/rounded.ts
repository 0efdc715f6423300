import type { Interval } from '$lib/stats/types';

/** Significant digits of numbers that are shown without their counts. */
export const DIGITS = 3;

/** A number at `digits` significant digits; null stays null. */
export function rounded<Value extends number | null>(value: Value, digits = DIGITS): Value {
  return (value === null ? null : Number(value.toPrecision(digits))) as Value;
}

/**
 * An interval with the digits that its width carries: two significant ones of it. A fixed number of digits would cut
 * [104.70, 105.26] to [105, 105], and claims would be held to a width that was never there.
 *
 * Limits go outward, and each stays at least as far from the rounded value as it was from the value: no claim lies
 * farther off, in uncertainties, than it does from the whole report. Nothing goes below 0 that was not.
 *
 * @param most significant digits of the value at most, whatever the width; all that an interval without width gets
 */
export function roundedOutward({ value, low, high }: Interval, most = Infinity): Interval {
  if (value === null) return { value, low, high };
  const width = Math.max(high === null ? 0 : high - value, low === null ? 0 : value - low);
  const whole = low === null || high === null ? 2 * width : high - low;
  const fewest = value === 0 ? -Infinity : power(value) - (Number.isFinite(most) ? most : DIGITS) + 1;
  const byWidth = whole > 0 ? power(whole) - 1 : -Infinity;
  const exponent = Number.isFinite(most) || byWidth === -Infinity ? Math.max(byWidth, fewest) : byWidth;
  if (exponent === -Infinity) return { value, low, high };

  const near = onGrid(value, exponent, Math.round);
  const down = low === null ? null : onGrid(Math.min(low, near - (value - low)), exponent, Math.floor);
  return {
    value: near,
    low: down !== null && low! >= 0 ? Math.max(0, down) : down,
    high: high === null ? null : onGrid(Math.max(high, near + (high - value)), exponent, Math.ceil)
  };
}

const power = (size: number): number => Math.floor(Math.log10(Math.abs(size)));

/** A billionth of a step is rounding of the machine: 0.07 · 100 is a little above 7. */
function onGrid(value: number, exponent: number, how: (steps: number) => number): number {
  const steps = value * 10 ** -exponent;
  const near = Math.round(steps);
  return Number(`${Math.abs(steps - near) < 1e-9 ? near : how(steps)}e${exponent}`) + 0;
}

/** Everything in a plain value with its numbers rounded: intervals outward, others to three digits; words stay. */
export function roundedAll<Value>(value: Value): Value {
  return walk(value) as Value;
}

function walk(value: unknown): unknown {
  if (typeof value === 'number') return rounded(value);
  if (Array.isArray(value)) return value.map(walk);
  if (typeof value !== 'object' || value === null) return value;
  if ('value' in value && 'low' in value && 'high' in value) return roundedOutward(value as Interval);
  return Object.fromEntries(Object.entries(value).map(([key, of]) => [key, walk(of)]));
}
