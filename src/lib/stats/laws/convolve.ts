import { smallestNormal, type Window } from './window';

/**
 * Law of the sum of two independent counts, from their windows: h_n = Σ_k f_k g_{n−k}.
 *
 * A sum of positive terms, so the relative error is about 1e-16 times the logarithm of its length, in
 * the far tail as at the mode; a transform would leave 1e-16 of the mode everywhere. Cost: product of the
 * lengths. Ends that fall under `trim` of the largest value are cut off.
 */
export function convolve(f: Window, g: Window, trim = 0): Window {
  const [long, short] = f.values.length >= g.values.length ? [f, g] : [g, f];
  const sums = new Float64Array(long.values.length + short.values.length - 1);
  for (let k = 0; k < short.values.length; k++) {
    // Dividing here keeps every product below the scale: two values near 1e290 would overflow.
    const weight = short.values[k] / short.scale;
    for (let n = 0; n < long.values.length; n++) sums[n + k] += weight * long.values[n];
  }
  let largest = 0;
  for (const value of sums) if (value > largest) largest = value;
  const least = Math.max(trim * largest, smallestNormal);
  let start = 0;
  let end = sums.length;
  while (sums[start] < least) start++;
  while (sums[end - 1] < least) end--;
  return { first: f.first + g.first + start, values: sums.slice(start, end), scale: long.scale };
}
