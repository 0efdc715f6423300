import type { Diagnosis } from '$lib/stats/types';

/**
 * Whether the Poisson law in the table of other laws is none of the independent-trial laws compared: N is known, and
 * a sum of N trials ends at N. With N unknown it is the limit of many rare trials, and one of them.
 */
export const poissonIsApart = ({ data, fit }: Diagnosis): boolean =>
  data.trials !== null && fit.references.some(({ id }) => id === 'rare-events');
