import { logChoose } from '../numerics/log-choose';

/**
 * ln p of Fisher's exact test, one-sided: the chance, both sums fixed, of as many shots on which both sites were
 * excited, or more. To be chosen before the data are seen, where only a positive association is looked for.
 *
 * @param both shots on which both sites were excited
 * @param first shots on which the first was, and `second` the second
 * @param shots S
 *
 * Source: Fisher 1935, J. R. Statist. Soc. 98:39.
 */
export function logRiseP(both: number, first: number, second: number, shots: number): number {
  const least = Math.max(0, first + second - shots);
  const most = Math.min(first, second);
  if (both <= least) return 0;
  const logPmf = (k: number) =>
    logChoose(first, k) + logChoose(shots - first, second - k) - logChoose(shots, second);
  if (both * shots <= first * second) {
    // At or under the mean the tail holds most of the mass, and its complement is what can be summed.
    let below = 0;
    for (let k = both - 1, term = 1; k >= least && term > below * 1e-17; k--) {
      below += term;
      term *= (k * (shots - first - second + k)) / ((first - k + 1) * (second - k + 1));
    }
    return Math.log1p(-Math.min(1, Math.exp(logPmf(both - 1)) * below));
  }
  let sum = 0;
  for (let k = both, term = 1; k <= most && term > sum * 1e-17; k++) {
    sum += term;
    term *= ((first - k) * (second - k)) / ((k + 1) * (shots - first - second + k + 1));
  }
  return Math.min(0, logPmf(both) + Math.log(sum));
}
