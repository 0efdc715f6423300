import type { FitData } from '../fit/fit-data';

/** The same histogram without its empty shots, and how many they were. */
export function setEmptyAside(data: FitData): { rest: FitData; empty: number } {
  if (data.first > 0 || data.shots.length === 0) return { rest: { ...data, withoutEmpty: true }, empty: 0 };
  const empty = data.shots[0];
  let start = 1;
  while (start < data.shots.length && data.shots[start] === 0) start++;
  // Field by field, in the order of fitData, and rounded to a small integer: another shape would have the whole fit
  // compiled once more.
  const rest: FitData = {
    trials: data.trials,
    first: start,
    shots: data.shots.subarray(start),
    lump: data.lump,
    below: data.below,
    total: Math.round(data.total - empty),
    withoutEmpty: true
  };
  return { rest, empty };
}
