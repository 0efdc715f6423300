import { normalQuantile } from '../numerics/normal-quantile';
import type { Interval } from '../types';
import { shotsForExcess, varianceShape } from './smallest-excess';

/** Shots in all that would decide, if the truth is what the data suggest; null when nothing suggests it. */
export interface Deciding {
  mean: number;
  trials: number | null;
  shots: number;
  dispersion: Interval;
  tolerance: number;
  alpha: number;
}

/** Quantile of a one-sided normal test at 80 % power. */
const power = 0.842;

/**
 * Shots that would turn "undecided" into an answer.
 *
 * - Variance at or below the ceiling: as many as see an excess of the tolerance.
 * - Between ceiling and tolerance: as many as bring the upper limit under the tolerance.
 * - Above the tolerance: as many as show the excess at level α.
 */
export function shotsToDecide({
  mean,
  trials,
  shots,
  dispersion,
  tolerance,
  alpha
}: Deciding): number | null {
  const shape = varianceShape(mean, trials);
  const least = shotsForExcess(mean, trials, tolerance);
  if (shape === null || least === null || dispersion.value === null) return null;
  const excess = dispersion.value - 1;
  const needed =
    excess >= tolerance
      ? shape * ((-normalQuantile(alpha) + power) / excess) ** 2
      : excess > 0
        ? Math.max(least, shape * ((1.96 + power) / (tolerance - excess)) ** 2)
        : least;
  // Already more than that and still undecided: the estimate was lucky, and twice as many is the honest reply.
  return Math.ceil(needed) > shots ? Math.ceil(needed) : 2 * shots;
}
