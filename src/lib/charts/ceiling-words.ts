import type { Diagnosis } from '$lib/stats/types';
import { formatNumber } from '$lib/model/format-number';

/** Where the variance stands: over the ceiling, under it, at it as far as matters, or not to be told. */
export function ceilingStanding({ moments, engine }: Diagnosis): 'more' | 'fewer' | 'within' | 'unsure' {
  const { low, high } = moments.dispersion;
  if (low === null || high === null) return 'unsure';
  if (low > 1) return 'more';
  if (high < 1) return 'fewer';
  return high <= 1 + engine.tolerance ? 'within' : 'unsure';
}

/** Variance over ceiling in one sentence. */
export function ceilingWords({ moments }: Diagnosis): string {
  const { value, low, high } = moments.dispersion;
  if (value === null) return 'These counts give no variance.';
  const interval =
    low === null || high === null ? 'no interval' : `${formatNumber(low, 3)} to ${formatNumber(high, 3)}`;
  return `The variance is ${formatNumber(value, 3)} times its ceiling (95 % interval: ${interval}).`;
}
