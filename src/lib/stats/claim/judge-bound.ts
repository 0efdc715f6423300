import type { Interval } from '../types';
import type { ClaimVerdict } from './judge-claim';

/**
 * Compares "less than `bound`", as p-values are often stated, with a value and its 95 % interval: it agrees when the
 * whole interval lies at or below the bound, disagrees when the whole interval lies above it, and cannot be told when
 * the bound lies within. A missing end is as far as it can be.
 *
 * @throws RangeError for a bound that is not finite
 */
export function judgeBound({ value, low, high }: Interval, bound: number): ClaimVerdict {
  if (!Number.isFinite(bound)) throw new RangeError(`not a finite bound: ${bound}`);
  if (value === null) return 'cannot-tell';
  if (high !== null && high <= bound) return 'agrees';
  if (low !== null && low > bound) return 'disagrees';
  return 'cannot-tell';
}
