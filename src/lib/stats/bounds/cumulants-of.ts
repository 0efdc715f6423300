import type { Cumulants } from '../laws/law-moments';
import type { PowerSums } from './power-sums';

/**
 * First four cumulants of a sum of independent trials from the power sums of their probabilities.
 *
 * κ1 = s1, κ2 = s1 − s2, κ3 = s1 − 3s2 + 2s3, κ4 = s1 − 7s2 + 12s3 − 6s4. The inverse of `powerSums`.
 */
export function cumulantsOf({ s1, s2, s3, s4 }: PowerSums): Cumulants {
  return {
    mean: s1,
    variance: s1 - s2,
    third: s1 - 3 * s2 + 2 * s3,
    fourth: s1 - 7 * s2 + 12 * s3 - 6 * s4
  };
}
