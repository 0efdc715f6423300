import { permute } from '../order/permute';
import {
  LONGEST_PERMUTED,
  SMALLEST_LIMIT_P,
  type OrderOptions,
  type OrderResult
} from '../order/order-outcome';
import { unbroken, type Pace } from '../resampling/pace';
import { changeLimit } from './change-limit';

/** The most supported single change of the mean, and how often chance supports one as well. */
export interface ChangePoint extends OrderResult {
  /** The first shot after the change. */
  at: number;
  before: number;
  after: number;
}

/** A change nearer to an end than this many shots is not sought: single shots would decide. */
const margin = 5;

/**
 * Most supported change point of the mean: the cut k that maximises the likelihood ratio of two means against one for
 * counts of a common variance, k(S − k)/S·(mean_before − mean_after)² over the variance, at least five shots from either
 * end. p by permuting the shots, the scan repeated on each: the search over all cuts is allowed for. Above 20 000 shots
 * by the limit law, where a single shot no longer decides (see changeLimit).
 *
 * @returns null for fewer than 20 shots, or shots all alike
 * Source: Hinkley 1970, Biometrika 57:1 (m); p by permutation.
 */
export async function changePoint(
  shots: ArrayLike<number>,
  options: OrderOptions,
  pace: Pace = unbroken
): Promise<ChangePoint | null> {
  const length = shots.length;
  const values = Float64Array.from(shots);
  const mean = values.reduce((sum, n) => sum + n, 0) / length;
  let square = 0;
  for (let i = 0; i < length; i++) {
    values[i] -= mean;
    square += values[i] * values[i];
  }
  if (length < 20 || square === 0) return null;
  const { at, score } = scan(values);
  const bar = score * (1 - 1e-11);
  const statistic = (score * length) / square;
  const result: Omit<OrderResult, 'statistic'> =
    length > LONGEST_PERMUTED
      ? {
          p: Math.max(SMALLEST_LIMIT_P, changeLimit(statistic, margin / length)),
          smallestP: SMALLEST_LIMIT_P,
          resamples: 0,
          stoppedEarly: false,
          source: 'limit'
        }
      : await permute(values, (order) => scan(order).score >= bar, options, pace);
  let sum = 0;
  for (let i = 0; i < at; i++) sum += values[i];
  return {
    ...result,
    statistic,
    at,
    before: mean + sum / at,
    after: mean - sum / (length - at)
  };
}

/** Largest of t_k²·S/(k(S − k)), t_k the sum of the first k distances from the mean. */
function scan(values: Float64Array): { at: number; score: number } {
  const length = values.length;
  let sum = 0;
  let at = margin;
  let score = -1;
  for (let k = 1; k <= length - margin; k++) {
    sum += values[k - 1];
    const here = (sum * sum * length) / (k * (length - k));
    if (k >= margin && here > score) [at, score] = [k, here];
  }
  return { at, score };
}
