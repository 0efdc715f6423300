import { ceiling } from '../bounds/ceiling';
import type { Interval } from '../types';
import type { PublishedCumulants } from './published-cumulants';

/**
 * Variance over ceiling as printed, with the least and the largest that numbers within `error` of mean and variance give:
 * what rounding leaves open, which is no confidence interval.
 *
 * @returns no value where the ceiling is 0 at the printed mean, no high end where it comes down to 0
 */
export function roundedDispersion({ trials, mean, variance }: PublishedCumulants): Interval {
  const top = ceiling(mean.value, trials);
  if (!(top > 0)) return { value: null, low: null, high: null };
  const from = Math.max(0, mean.value - mean.error);
  const to = Math.min(trials ?? Infinity, mean.value + mean.error);
  // The ceiling is concave in the mean: least at an end, largest at an end or at N/2.
  const ends = [ceiling(from, trials), ceiling(to, trials)];
  const least = Math.min(...ends);
  const largest = trials !== null && from < trials / 2 && trials / 2 < to ? trials / 4 : Math.max(...ends);
  return {
    value: variance.value / top,
    low: Math.max(0, variance.value - variance.error) / largest,
    high: least > 0 ? (variance.value + variance.error) / least : null
  };
}
