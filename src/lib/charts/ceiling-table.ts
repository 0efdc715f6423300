import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** The numbers behind the ceiling chart. */
export const ceilingTable = ({ moments, engine }: Diagnosis): Table => ({
  columns: [
    { title: 'quantity', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: [
    ['variance', moments.variance.value, moments.variance.low, moments.variance.high],
    ['ceiling', moments.ceiling, null, null],
    ['variance over ceiling', moments.dispersion.value, moments.dispersion.low, moments.dispersion.high],
    ['excess that matters', engine.tolerance, null, null]
  ]
});
