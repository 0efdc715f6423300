import type { Diagnosis } from '$lib/stats/types';
import { formatNumber } from '../format-number';

/** How many trials the variance needs to fit under the ceiling. */
export function sayCriticalTrials({ moments, data }: Diagnosis): string {
  if (moments.criticalTrials === null)
    return 'The variance is not below the mean: no number of trials brings it under a ceiling.';
  const here = data.trials === null ? '' : `; here N is ${data.trials}`;
  return `The variance fits under the ceiling when N is at least ${formatNumber(moments.criticalTrials, 3)}${here}.`;
}
