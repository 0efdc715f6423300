import { varianceShape } from '../answer/smallest-excess';
import { normalQuantile } from '../numerics/normal-quantile';

/** How sharp a planned test is. */
export interface Sharpness {
  /** Level of the one-sided test, 0 < α < 0.5. */
  alpha: number;
  /** Chance to see what is there, between α and 1. */
  power: number;
}

/**
 * Shots with which the ceiling test sees a variance of 1 + excess ceilings: (z_{1−α} + z_power)²(2 + κ4/κ2²)/excess²,
 * from the sampling error of a variance, with κ4/κ2² of equal trials. At 5 % and 80 % the first factor is 2.49².
 *
 * @param mean mean count, 0 < mean < N
 * @param trials N, or null when unknown
 * @param excess as a part of the ceiling, > 0
 * @returns a whole number; null when the ceiling is 0 or a number is out of its range
 */
export function shotsForExcess(
  mean: number,
  trials: number | null,
  excess: number,
  { alpha, power }: Sharpness
): number | null {
  const shape = varianceShape(mean, trials);
  const reach = reachOf({ alpha, power });
  if (shape === null || reach === null || !(excess > 0)) return null;
  return Math.ceil(shape * (reach / excess) ** 2);
}

/** Smallest excess over the ceiling that `shots` shots see; the inverse of `shotsForExcess`. */
export function excessOfShots(
  mean: number,
  trials: number | null,
  shots: number,
  sharpness: Sharpness
): number | null {
  const shape = varianceShape(mean, trials);
  const reach = reachOf(sharpness);
  if (shape === null || reach === null || !(shots > 0)) return null;
  return reach * Math.sqrt(shape / shots);
}

/** z_{1−α} + z_power. */
function reachOf({ alpha, power }: Sharpness): number | null {
  if (!(alpha > 0 && alpha < 0.5 && power > alpha && power < 1)) return null;
  return normalQuantile(power) - normalQuantile(alpha);
}
