import { ceiling } from '../bounds/ceiling';
import type { Cumulants } from '../laws/law-moments';

/** Variance over ceiling under a law, and how it scatters from one experiment to the next. */
export interface DispersionSpread {
  /** r = κ2/ceiling(κ1). */
  ratio: number;
  /** S times the relative variance of s²/ceiling(mean): divide by the shots. */
  shape: number;
}

/**
 * Sampling error of variance over ceiling, both from the same S shots, to first order in 1/S:
 * [κ4 + 2κ2² − 2g κ3 + g² κ2]/κ2², g = r(1 − 2μ/N) the slope of r·ceiling.
 *
 * The mean is estimated too, and the ceiling follows it. For equal trials this is 2(1 − 1/N), for a Poisson law 2,
 * whatever the mean; without the ceiling's part, 2 + κ4/κ2², it would be three instead of two for a mean of 1.
 */
export function dispersionSpread(
  { mean, variance, third, fourth }: Cumulants,
  trials: number | null
): DispersionSpread {
  const ratio = variance / ceiling(mean, trials);
  const slope = ratio * (1 - (trials === null ? 0 : (2 * mean) / trials));
  const spread = fourth + 2 * variance * variance - 2 * slope * third + slope * slope * variance;
  return { ratio, shape: spread / (variance * variance) };
}
