import { deviancePart } from '../numerics/deviance-part';

/**
 * Natural logarithm of Chernoff's bound on a tail, from the mean alone: −N·D(n/N ‖ μ/N).
 *
 * @param side `high` bounds P(X ≥ count), `low` bounds P(X ≤ count)
 * @param count n, 0 ≤ n ≤ N
 * @param mean μ, 0 ≤ μ ≤ N
 * @param trials N, or null when unknown or unbounded: then −(n ln(n/μ) + μ − n), the Poisson form
 * @returns ≤ 0; 0, that is the bound 1, up to and including the mean on the wrong side of it; −Infinity for a
 *   tail outside 0 … N; NaN for a mean out of range
 *
 * Source: Chernoff 1952, Ann. Math. Stat. 23:493. Holds for every sum of independent trials, since
 * Σ ln(1 + p_k(e^θ − 1)) is largest for equal p.
 */
export function logMeanChernoff(
  side: 'high' | 'low',
  count: number,
  mean: number,
  trials: number | null
): number {
  if (!(mean >= 0) || (trials !== null && !(mean <= trials))) return NaN;
  if (side === 'high' ? count <= mean : count >= mean) return 0;
  if (count < 0 || (trials !== null && count > trials)) return -Infinity;
  const defects = deviancePart(count, mean);
  return trials === null ? -defects : -(defects + deviancePart(trials - count, trials - mean, mean - count));
}
