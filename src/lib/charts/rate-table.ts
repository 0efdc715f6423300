import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** Every rate of the document. */
export const rateTable = ({ rate }: Diagnosis): Table => ({
  columns: [
    { title: 'count', kind: 'whole' },
    { title: 'density', kind: 'number' },
    { title: 'seen rate', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'best law', kind: 'number' },
    { title: 'limit', kind: 'number' },
    { title: 'Gaussian', kind: 'number' }
  ],
  rows: rate.points.map((point) => [
    point.count,
    point.density,
    point.empirical,
    point.low,
    point.high,
    point.fitted,
    point.limit,
    point.gaussian
  ])
});
