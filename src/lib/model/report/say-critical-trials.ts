import type { Diagnosis } from '$lib/stats/types';
import { lumpsOf, lumpWords } from '../lump-words';
import { formatCount, formatNumber } from '../format-number';

/** How many trials the variance needs to fit under the ceiling, or why that is not told. */
export function sayCriticalTrials({ moments, data, nuisances }: Diagnosis): string {
  if (moments.criticalTrials !== null) {
    const here = data.trials === null ? '' : `; here N is ${formatCount(data.trials)}`;
    return `The variance fits under the ceiling when N is at least ${formatNumber(moments.criticalTrials, 3)}${here}.`;
  }
  if (nuisances?.misread?.applied)
    return 'Misreads are allowed for, and the ceiling with them depends on N and on the rate: no least N is given.';
  if (data.lump !== null || data.below)
    return `${lumpWords(lumpsOf(data)).rows}, so that no least N can be given.`;
  if (moments.variance.value === null) return 'One shot has no variance, so that no least N can be given.';
  return 'The variance is not below the mean: no number of trials brings it under a ceiling.';
}
