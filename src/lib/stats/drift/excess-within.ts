import type { Interval } from '../types';
import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import type { BatchParts } from './batch-parts';

/**
 * Variance over ceiling with batches taken one by one and pooled: Σ(n − mean_b)² over Σ(n_b − 1)·ceiling(mean_b). What is
 * above 1 here is not drift between batches. Limits as of equal trials with S − B degrees of freedom (Fisher's index of
 * dispersion), so they are narrow for counts that scatter more. The ceiling at a batch's own mean is short by a part
 * 1/(N n_b) at most, since the mean is itself uncertain; that is left as it is.
 *
 * @param trials N, or null when unknown
 * @returns nulls where every batch has mean 0 or N, or one shot
 */
export function excessWithin({ batches, ratio }: BatchParts, trials: number | null): Interval {
  let squares = 0;
  let allowed = 0;
  for (const { shots, mean, variance } of batches) {
    if (variance === null) continue;
    squares += (shots - 1) * variance;
    allowed += (shots - 1) * mean * (1 - (trials === null ? 0 : mean / trials));
  }
  if (!(allowed > 0)) return { value: null, low: null, high: null };
  const value = squares / allowed;
  const { low, high } = evenDispersionFactors(ratio.within + 1, trials, 0.025);
  return { value, low: value * low, high: value * high };
}
