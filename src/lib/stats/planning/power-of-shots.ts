import { normalCdf } from '../numerics/normal-cdf';
import { normalQuantile } from '../numerics/normal-quantile';
import type { DispersionSpread } from './dispersion-spread';

/**
 * Chance that the ceiling test with S shots sees a dispersion of this spread.
 *
 * The dispersion of S shots is taken as a multiple of χ² with the degrees of freedom that its spread asks for, and its
 * cube root as normal: (D/r)^{1/3} ~ N(1 − v/9, v/9), v = shape/S. With many shots that is the plain normal formula;
 * with a hundred it also has the lean of a variance.
 *
 * @param trials N, or null: under independence the shape is that of equal trials, 2(1 − 1/N)
 * @param alpha level of the one-sided test, 0 < α < 0.5
 * Source: Wilson & Hilferty 1931, PNAS 17:684 (m), for the cube root.
 */
export function powerOfShots(
  { ratio, shape }: DispersionSpread,
  trials: number | null,
  shots: number,
  alpha: number
): number {
  const none = nullShape(trials) / shots / 9;
  const some = shape / shots / 9;
  const cut = 1 - none - normalQuantile(alpha) * Math.sqrt(none);
  return normalCdf((1 - some - cut / Math.cbrt(ratio)) / Math.sqrt(some));
}

/** S times the relative variance of variance over ceiling for equal trials. */
export const nullShape = (trials: number | null): number => 2 * (1 - (trials === null ? 0 : 1 / trials));
