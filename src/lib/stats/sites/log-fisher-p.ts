import { logChoose } from '../numerics/log-choose';

/** Tables as likely as the observed one to this relative error count as equally likely: R's fisher.test has the same. */
const tie = 1e-7;

/**
 * ln p of Fisher's exact test, two-sided: the chance, both sums fixed, of a table no likelier than the observed one.
 * No mid-p: the level is kept for every S and every rate of excitation. A site that never or always reads 1 gives 0.
 *
 * The tails are summed relative to the observed table, so that p far below the smallest double keeps its digits.
 *
 * @param both shots on which both sites were excited
 * @param first shots on which the first was, and `second` the second
 * @param shots S
 *
 * Source: Fisher 1935, J. R. Statist. Soc. 98:39.
 */
export function logFisherP(both: number, first: number, second: number, shots: number): number {
  const least = Math.max(0, first + second - shots);
  const most = Math.min(first, second);
  const mode = Math.min(most, Math.max(least, Math.floor(((first + 1) * (second + 1)) / (shots + 2))));
  if (both === mode) return 0;
  const logPmf = (k: number) =>
    logChoose(first, k) + logChoose(shots - first, second - k) - logChoose(shots, second);
  const observed = logPmf(both);
  const way = both > mode ? 1 : -1;
  const end = way === 1 ? least : most;
  let outside = end - way;
  let inside = mode;
  while ((inside - outside) * way > 1) {
    const middle = Math.floor((inside + outside) / 2);
    if (logPmf(middle) <= observed + tie) outside = middle;
    else inside = middle;
  }
  if (logPmf(mode) <= observed + tie) outside = mode;
  // The next table outward, over this one.
  const ratio = (k: number, step: number) =>
    step === 1
      ? ((first - k) * (second - k)) / ((k + 1) * (shots - first - second + k + 1))
      : (k * (shots - first - second + k)) / ((first - k + 1) * (second - k + 1));
  const tail = (start: number, step: number) => {
    let sum = 0;
    for (let k = start, term = 1; k >= least && k <= most && term > sum * 1e-17; k += step) {
      sum += term;
      term *= ratio(k, step);
    }
    return sum;
  };
  const near = tail(both, way);
  const far = (outside - end) * way >= 0 ? Math.exp(logPmf(outside) - observed) * tail(outside, -way) : 0;
  return Math.min(0, observed + Math.log(near + far));
}
