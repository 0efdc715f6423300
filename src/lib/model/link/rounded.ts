import type { Interval } from '$lib/stats/types';

/** Significant digits of numbers that are shown without their counts. */
export const DIGITS = 3;

/** A number at three significant digits; null stays null. */
export function rounded<Value extends number | null>(value: Value): Value {
  return (value === null ? null : Number(value.toPrecision(DIGITS))) as Value;
}

/** An interval at three significant digits. */
export function roundedInterval({ value, low, high }: Interval): Interval {
  return { value: rounded(value), low: rounded(low), high: rounded(high) };
}
