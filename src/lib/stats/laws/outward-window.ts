import { smallestNormal, type Window } from './window';

/**
 * A pmf built outward from its mode by ratios and normalised by its own sum, so that no gamma function
 * enters and the relative error grows by about 1e-16 a step from the mode.
 *
 * @param mode count to start from
 * @param downRatio f_{n−1}/f_n; 0 ends the window
 * @param upRatio f_{n+1}/f_n; 0 ends the window
 * @param trim part of the mode's probability below which values are left out; 0 keeps all that doubles
 *   hold, about 600 decades at the deep scale
 * @param scale what the values sum to
 */
export function outwardWindow(
  mode: number,
  downRatio: (n: number) => number,
  upRatio: (n: number) => number,
  trim: number,
  scale: number
): Window {
  const least = Math.max(trim * scale, smallestNormal);
  const below = walk(mode, -1, downRatio, least, scale);
  const above = walk(mode, 1, upRatio, least, scale);
  // Small terms first, so that the sum keeps their digits.
  let lower = 0;
  for (let i = below.length - 1; i >= 0; i--) lower += below[i] / scale;
  let upper = 0;
  for (let i = above.length - 1; i >= 0; i--) upper += above[i] / scale;
  const factor = 1 / (lower + 1 + upper);
  const values = new Float64Array(below.length + 1 + above.length);
  for (let i = 0; i < below.length; i++) values[below.length - 1 - i] = below[i] * factor;
  values[below.length] = scale * factor;
  for (let i = 0; i < above.length; i++) values[below.length + 1 + i] = above[i] * factor;
  return { first: mode - below.length, values, scale };
}

function walk(
  mode: number,
  step: number,
  ratio: (n: number) => number,
  least: number,
  peak: number
): number[] {
  const values: number[] = [];
  for (let n = mode, value = peak; ; n += step) {
    value *= ratio(n);
    if (!(value > least)) return values;
    values.push(value);
  }
}
