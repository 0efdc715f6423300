import { logBinomialTail } from '../numerics/log-binomial-tail';
import { logPoissonTail } from '../numerics/log-poisson-tail';

/**
 * Natural logarithm of the largest tail probability that any sum of independent trials with a given mean allows.
 *
 * @param side `high` bounds P(X ≥ count), `low` bounds P(X ≤ count)
 * @param count a whole number
 * @param mean μ, 0 ≤ μ ≤ N
 * @param trials N, or null when unknown or unbounded
 * @returns the tail of Binomial(N, μ/N), or of Poisson(μ), for count ≥ μ + 1 (high) and count ≤ μ − 1 (low);
 *   0, that is the bound 1, in between, where the theorem says nothing; NaN for a mean out of range
 *
 * Source: Hoeffding 1956, Ann. Math. Stat. 27:713, theorem 4; for unknown N its limit, since the binomial bound
 * grows with N there.
 */
export function logHoeffdingTail(
  side: 'high' | 'low',
  count: number,
  mean: number,
  trials: number | null
): number {
  if (!(mean >= 0) || (trials !== null && !(mean <= trials))) return NaN;
  if (side === 'high' ? !(count >= mean + 1) : !(count <= mean - 1)) return 0;
  if (trials === null) return logPoissonTail(side, count, mean);
  const rest = trials - mean;
  // A mean near N is told by what it lacks: μ/N itself would round away 1 − μ/N.
  if (mean <= rest) return logBinomialTail(side, count, trials, mean / trials);
  return logBinomialTail(side === 'high' ? 'low' : 'high', trials - count, trials, rest / trials);
}
