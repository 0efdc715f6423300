import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** How far the best law lies from the counts, by every measure of the document; nats are a shot's. */
export const fitTable = ({ fit }: Diagnosis): Table => ({
  columns: [
    { title: 'quantity', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: [
    ['divergence, nats', fit.divergence, null, null],
    ['floor, nats', fit.floor, null, null],
    [
      'divergence, chance taken off, nats',
      fit.divergenceInterval.value,
      fit.divergenceInterval.low,
      fit.divergenceInterval.high
    ],
    ['G²', fit.gSquared, null, null],
    ['shots that make it noticeable', fit.shotsToNotice, null, null]
  ]
});
