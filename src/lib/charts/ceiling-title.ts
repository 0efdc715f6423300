import type { Diagnosis } from '$lib/stats/types';
import { ceilingStanding } from './ceiling-words';

const TITLES = {
  more: 'The variance is over the ceiling of independent trials',
  fewer: 'The variance lies below the ceiling: the counts are more regular than equal trials',
  within: 'The variance keeps to the ceiling of independent trials',
  unsure: 'The variance cannot be told from its ceiling with these shots'
};

/** The finding about the variance, as a title. */
export const ceilingTitle = (diagnosis: Diagnosis): string => TITLES[ceilingStanding(diagnosis)];
