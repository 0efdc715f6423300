import type { NullLaw } from '../nulls/null-law';
import { equalSquares } from './equal-squares';

/** Mean and variance of Σ(n − mean)² within one batch, for the most dispersed law of what is tested against. */
export interface SquaresLaw {
  of(total: number, shots: number): { mean: number; variance: number };
  /** N of independent trials, null when unknown; undefined where places are not alike, so that none can be strewn. */
  trials?: number | null;
}

/** Independent trials: exact, given the total of the batch. */
export const equalSquaresLaw = (trials: number | null): SquaresLaw => ({
  of: (total, shots) => equalSquares(total, shots, trials),
  trials
});

/**
 * Another null: (shots − 1)·ceiling(mean of the batch), and the variance of a sum of squares less what its own mean
 * explains, κ2²·(2/(shots − 1) + shape/shots)·(shots − 1)² with shape = (κ4 − 2cκ3 + c²κ2)/κ2², c the slope of the
 * ceiling, of the most dispersed law at the mean of all shots.
 */
export function readSquaresLaw({ window, ceiling }: NullLaw['mostDispersed'], slope: number): SquaresLaw {
  const { first, values, scale } = window;
  const moment = (of: (n: number) => number) =>
    values.reduce((sum, f, i) => sum + (f / scale) * of(first + i), 0);
  const mean = moment((n) => n);
  const second = moment((n) => (n - mean) ** 2);
  const third = moment((n) => (n - mean) ** 3);
  const fourth = moment((n) => (n - mean) ** 4) - 3 * second * second;
  const shape = (fourth - 2 * slope * third + slope * slope * second) / (second * second);
  return {
    of(total, shots) {
      const allowed = (shots - 1) * Math.max(0, ceiling(total / shots));
      return {
        mean: allowed,
        variance: allowed * allowed * Math.max(0, 2 / (shots - 1) + shape / shots)
      };
    }
  };
}
