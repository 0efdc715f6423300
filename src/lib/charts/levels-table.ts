import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** The distinct probabilities of the best law; no rows when it has none. */
export const levelsTable = ({ fit }: { fit: Pick<Diagnosis['fit'], 'levels' | 'poissonPart'> }): Table => ({
  columns: [
    { title: 'part', kind: 'text' },
    { title: 'how many', kind: 'whole' },
    { title: 'probability of each, or mean', kind: 'number' }
  ],
  rows: [
    ...fit.levels
      .filter(({ trials }) => trials > 0)
      .map(({ p, trials }): (string | number)[] => ['trials', trials, p]),
    ...(fit.poissonPart > 0 ? [['rare events, mean count', '', fit.poissonPart]] : [])
  ]
});
