/** One pair of sites in one map: shots on which both, the first, and the second were excited, of all. */
export interface PairTable {
  both: number;
  first: number;
  second: number;
  shots: number;
}

/** Splits as likely as the observed one to this relative error count as equally likely: as in logFisherP. */
const tie = 1e-7;

/**
 * ln p that a pair's association is the same in two maps: the exact test that two 2×2 tables share one odds ratio. With all
 * sums of both tables fixed, and the number of shots with both sites excited in the two together, how that number is split
 * follows C(a₁,k)·C(S₁−a₁,b₁−k)·C(a₂,t−k)·C(S₂−a₂,b₂−t+k), whatever the common odds ratio is. Rates may differ between
 * the maps. The level is kept for every S; no mid-p.
 *
 * @param seek `rise`: one-sided, more in the later map; `any`: all splits no likelier than the observed one
 *
 * Source: Zelen 1971, Biometrika 58:129 (the exact test of homogeneity).
 */
export function logChangeP(earlier: PairTable, later: PairTable, seek: 'any' | 'rise'): number {
  const total = earlier.both + later.both;
  const least = (of: PairTable) => Math.max(0, of.first + of.second - of.shots);
  const most = (of: PairTable) => Math.min(of.first, of.second);
  const from = Math.max(least(later), total - most(earlier));
  const to = Math.min(most(later), total - least(earlier));
  // The next split over this one, in each map: much quicker than eight binomial coefficients a split.
  const up = ({ first, second, shots }: PairTable, k: number) =>
    ((first - k) * (second - k)) / ((k + 1) * (shots - first - second + k + 1));
  const weights = new Float64Array(to - from + 1);
  for (let k = from; k < to; k++)
    weights[k - from + 1] = weights[k - from] + Math.log(up(later, k)) - Math.log(up(earlier, total - k - 1));
  let peak = -Infinity;
  for (const weight of weights) peak = Math.max(peak, weight);
  const observed = weights[later.both - from];
  let all = 0;
  let tail = 0;
  for (const [i, weight] of weights.entries()) {
    const term = Math.exp(weight - peak);
    all += term;
    const counts = seek === 'rise' ? from + i >= later.both : weight <= observed + tie;
    if (counts) tail += Math.exp(weight - observed);
  }
  return Math.min(0, observed - peak + Math.log(tail) - Math.log(all));
}
