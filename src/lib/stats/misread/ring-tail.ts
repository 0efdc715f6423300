import { logHoeffdingTail } from '../bounds/log-hoeffding-tail';

/** Bound of a tail for trials of a given mean. */
type TailBound = (side: 'high' | 'low', count: number, mean: number, trials: number) => number;

/**
 * A bound for independent trials as one for kinks round a ring, all in single kinks. An even total leaves the even part
 * of a polynomial with real zeros, which has real zeros in z² (Hermite and Biehler): half the count is a sum of ⌊N/2⌋
 * independent trials.
 */
export const ringTail =
  (bound: TailBound = logHoeffdingTail): TailBound =>
  (side, count, mean, bonds) =>
    bound(
      side,
      side === 'high' ? Math.ceil(count / 2) : Math.floor(count / 2),
      mean / 2,
      Math.floor(bonds / 2)
    );
