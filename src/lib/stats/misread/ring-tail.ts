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
  (side, count, mean, bonds) => {
    const pairs = Math.floor(bonds / 2);
    // An odd bond stays without a kink, so a limit of the mean may lie beyond what a ring can give.
    return bound(
      side,
      side === 'high' ? Math.ceil(count / 2) : Math.floor(count / 2),
      Math.min(mean / 2, pairs),
      pairs
    );
  };
