import type { Explanation } from './types';

/**
 * Whether an explanation is rejected by its own goodness of fit: at the level of the answer, or by as much as its
 * resamples can show. The one threshold of all words about it. False where the fit was not asked.
 *
 * @param alpha level of the answer
 */
export const rejected = ({ goodness }: Pick<Explanation, 'goodness'>, alpha: number): boolean =>
  goodness !== null && goodness.p <= Math.max(alpha, goodness.smallestP);
