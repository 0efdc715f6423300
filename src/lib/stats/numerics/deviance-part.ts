/**
 * Deviance part D(x; m) = x ln(x/m) + m − x, the exponent by which a count x departs from its mean m.
 *
 * @param x count, ≥ 0
 * @param mean m, ≥ 0
 * @param difference x − m, when the caller knows it with more digits than the subtraction leaves: for
 *   counts near 2^53 the rounding of m = np alone shifts the pmf by 1e-8
 * @returns ≥ 0, relative error about 1e-15; m at x = 0, Infinity when m = 0 < x, NaN for negative input.
 *
 * Near x = m the two terms cancel, so the series in v = (x−m)/(x+m) is summed there:
 * D = (x−m)v + 2x(v³/3 + v⁵/5 + …).
 * Source: Loader 2000 (bd0).
 */
export function deviancePart(x: number, mean: number, difference = x - mean): number {
  if (!(x >= 0 && mean >= 0)) return NaN;
  if (x === 0) return mean;
  if (mean === 0) return Infinity;
  const v = difference / (x + mean);
  if (Math.abs(v) < 0.1) {
    const square = v * v;
    let sum = difference * v;
    let power = 2 * x * v;
    for (let j = 3; j < 60; j += 2) {
      power *= square;
      const next = sum + power / j;
      if (next === sum) break;
      sum = next;
    }
    return sum;
  }
  const ratio = x / mean;
  const logRatio = ratio > 1e-300 && ratio < 1e300 ? Math.log(ratio) : Math.log(x) - Math.log(mean);
  return x * logRatio - difference;
}
