import type { RateSpread } from '../rate-interval/types';
import type { Interval, Level } from '../types';

/** What misread sites do to counts of kinks on an open chain, where one misread site toggles two bonds. */
export interface MisreadPart {
  /** True: a rate was stated, and every test, bound and flag allows for it; moments.ceiling is then this ceiling. */
  applied: boolean;
  rate: number | null;
  /** Largest variance that independent kinks have as read; null when not applied. */
  ceiling: number | null;
  /** The ceiling without misreads, and variance over it. */
  rawCeiling: number;
  rawDispersion: number | null;
  /** Rate that would explain the variance by itself; limits from those of the variance. 0: none is needed; null: none would do. */
  neededRate: Interval;
  /** Largest rate that the mean count allows, five standard errors allowed for; since engine 0.6. */
  largestRate?: number;
  /** The answer over the interval of a rate with an uncertainty; since engine 0.6. */
  spread?: RateSpread;
  /** Fitted kink probabilities in the order of the bonds; null when not applied. */
  kinks: Level[] | null;
}
