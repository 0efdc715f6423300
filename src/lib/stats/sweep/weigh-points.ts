import { firstQuantities } from './first-quantities';
import type { SweepPoint } from './fit-power-laws';
import { inverseSymmetric } from './inverse-symmetric';

/** Points with only their first few quantities, ready to be fitted. */
export interface WeighedPoints {
  quantities: number;
  points: SweepPoint[];
  /** Inverse of each covariance; null where it is singular. */
  weights: (number[] | null)[];
}

/**
 * The points with all their quantities, then with one fewer each time, down to two, and the weights of each: what fits
 * of many windows share.
 */
export function weighPoints(points: SweepPoint[]): WeighedPoints[] {
  const all = points[0]?.values.length ?? 0;
  return Array.from({ length: Math.max(0, all - 1) }, (_, i) => {
    const some = firstQuantities(points, all - i);
    return {
      quantities: all - i,
      points: some,
      weights: some.map(({ covariance }) => inverseSymmetric(covariance, all - i))
    };
  });
}
