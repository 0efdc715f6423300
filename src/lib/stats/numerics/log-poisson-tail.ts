import { logGammaTail } from './log-gamma-tail';

/**
 * ln P(X ≥ k) (`high`) or ln P(X ≤ k) (`low`) for X ~ Poisson(mean).
 *
 * @param k count; a fraction is rounded to the next count inside the tail
 * @param mean ≥ 0
 * @returns ≤ 0; the probability has a relative error of about 1e-13 down to 1e-300, below that the log has one
 *   of 1e-15. −Infinity where the tail is empty, NaN for a negative mean.
 *
 * P(X ≥ k) = P(k, mean) and P(X ≤ k) = Q(k + 1, mean), the regularised incomplete gamma functions.
 */
export function logPoissonTail(side: 'high' | 'low', k: number, mean: number): number {
  if (!(mean >= 0) || Number.isNaN(k)) return NaN;
  const count = side === 'high' ? Math.ceil(k) : Math.floor(k);
  if (side === 'high') return count <= 0 ? 0 : logGammaTail('lower', count, mean);
  return count < 0 ? -Infinity : logGammaTail('upper', count + 1, mean);
}
