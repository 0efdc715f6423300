import { rejected } from '$lib/stats/explanations/rejected';
import type { Explanation } from '$lib/stats/explanations/types';

/**
 * What its own fit says against an explanation, beside its weight: a weight sets it against the others of the list and
 * knows nothing of whether it fits. '' where nothing is said against it, or its fit was not asked.
 */
export function sayFit(one: Pick<Explanation, 'goodness' | 'behind'>, alpha: number): string {
  if (!rejected(one, alpha)) return '';
  return one.behind === 0 ? 'best of these, and does not fit' : 'does not fit';
}
