import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** Every count of the document, with its interval and the law. */
export const distributionTable = ({ distribution }: Diagnosis): Table => ({
  columns: [
    { title: 'count', kind: 'text' },
    { title: 'shots', kind: 'whole' },
    { title: 'share', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'best law', kind: 'number' }
  ],
  rows: distribution.map((point) => [
    point.below ? `0–${point.count}` : point.lump ? `${point.count}+` : point.count,
    point.shots,
    point.observed,
    point.low,
    point.high,
    point.fitted
  ])
});
