/**
 * The pmf that is left when one trial of probability p is taken out: f_n = (1−p) g_n + p g_{n−1}.
 *
 * @param f consecutive probabilities, zero outside the first `length` of the buffer
 * @param p probability of the trial, 0 ≤ p ≤ 1
 * @param g receives the result, from the same first count
 *
 * Solved upward for p ≤ ½ and downward for p > ½: the error of a step is then multiplied by p/(1−p) or
 * its inverse, whichever is at most 1, and cannot grow.
 */
export function removeTrial(f: Float64Array, length: number, p: number, g: Float64Array): void {
  if (p <= 0.5) {
    const over = 1 / (1 - p);
    const ratio = p * over;
    let before = 0;
    for (let n = 0; n < length; n++) {
      before = f[n] * over - ratio * before;
      g[n] = before;
    }
    return;
  }
  const over = 1 / p;
  const ratio = (1 - p) * over;
  let after = 0;
  g[length - 1] = 0;
  for (let n = length - 1; n > 0; n--) {
    after = f[n] * over - ratio * after;
    g[n - 1] = after;
  }
}
