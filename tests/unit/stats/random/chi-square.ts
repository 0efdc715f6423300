/**
 * Pearson's chi-square of observed cells against their probabilities, as a standard normal score through the
 * cube root (Wilson & Hilferty 1931): independent of everything under test. Neighbouring cells are joined until
 * each expects at least ten draws. Scores above 4 have odds of 3e-5, and the seeds are fixed.
 */
export function chiSquareScore(observed: ArrayLike<number>, probabilities: ArrayLike<number>): number {
  let draws = 0;
  for (let i = 0; i < observed.length; i++) draws += observed[i];
  let chiSquare = 0;
  let cells = 0;
  let seen = 0;
  let expected = 0;
  let expectedLeft = draws;
  for (let i = 0; i < observed.length; i++) {
    seen += observed[i];
    expected += draws * probabilities[i];
    expectedLeft -= draws * probabilities[i];
    const last = i === observed.length - 1;
    if (last || (expected >= 10 && expectedLeft >= 10)) {
      if (expected === 0 && seen === 0) continue;
      chiSquare += (seen - expected) ** 2 / expected;
      cells++;
      seen = 0;
      expected = 0;
    }
  }
  const freedom = cells - 1;
  if (freedom < 1) throw new Error('one cell only: nothing is tested');
  const variance = 2 / (9 * freedom);
  return ((chiSquare / freedom) ** (1 / 3) - (1 - variance)) / Math.sqrt(variance);
}

/**
 * Probabilities of the law whose neighbouring probabilities have the ratio `ratio(k)` = f(k+1)/f(k), over
 * `from` … `to`, from a start near the mode outward and then brought to sum 1. No gamma function enters.
 */
export function lawByRatios(
  from: number,
  mode: number,
  to: number,
  ratio: (k: number) => number
): Float64Array {
  const pmf = new Float64Array(to - from + 1);
  pmf[mode - from] = 1;
  for (let k = mode; k < to; k++) pmf[k + 1 - from] = pmf[k - from] * ratio(k);
  for (let k = mode; k > from; k--) pmf[k - 1 - from] = pmf[k - from] / ratio(k - 1);
  const total = pmf.reduce((sum, f) => sum + f, 0);
  return pmf.map((f) => f / total);
}
