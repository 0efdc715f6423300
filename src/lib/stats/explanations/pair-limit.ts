import type { Interval } from '../types';
import { formatNumber } from '../words/format-number';
import type { PairLimit } from './types';

/**
 * How strongly trials must go together at least, whatever ties them and however their probabilities differ.
 *
 * - Σ_{i≠j} Cov = Var − Σ p_i(1−p_i) ≥ Var − ceiling, so the mean covariance of two trials is at least
 *   (Var − ceiling)/(N(N−1)).
 * - With σ_i² = p_i(1−p_i), Σ_{i≠j} σ_iσ_j ≤ (N−1) Σ σ_i² ≤ (N−1)·ceiling. For Var > ceiling the mean correlation
 *   weighted by σ_iσ_j is therefore at least (Var/ceiling − 1)/(N−1); for equal p that is the plain mean.
 *
 * @param ceiling of the mean seen
 * @param dispersion unbiased variance over ceiling
 * @returns null for N unknown or below 2, and when the variance is not over the ceiling
 */
export function pairLimit(trials: number | null, ceiling: number, dispersion: Interval): PairLimit | null {
  const { value, low } = dispersion;
  if (trials === null || trials < 2 || value === null || !(value > 1)) return null;
  const covariance = ((value - 1) * ceiling) / (trials * (trials - 1));
  const correlation = (value - 1) / (trials - 1);
  const correlationLow = low === null ? null : Math.max(0, low - 1) / (trials - 1);
  const limit =
    correlationLow === null
      ? ''
      : correlationLow > 0
        ? ` With what chance allows (95\u202f%) it is still at least ${formatNumber(correlationLow, 2)}.`
        : ' Chance alone could leave it at 0 (95\u202f%).';
  return {
    covariance,
    correlation,
    correlationLow,
    statement:
      `Whatever the cause, two trials are correlated by at least ${formatNumber(correlation, 2)} on average ` +
      `(covariance at least ${formatNumber(covariance, 2)}): the variance above its ceiling can come from nowhere else.${limit}`
  };
}
