import type { Diagnosis } from '$lib/stats/types';
import type { Table } from './table';

/** Every tail of the document with its bounds. */
export const tailsTable = ({ tails }: Diagnosis): Table => ({
  columns: [
    { title: 'tail', kind: 'text' },
    { title: 'shots', kind: 'whole' },
    { title: 'share', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'best law', kind: 'number' },
    { title: 'Chernoff', kind: 'number' },
    { title: 'Chernoff, mean alone', kind: 'number' },
    { title: 'Hoeffding', kind: 'number' }
  ],
  rows: tails.points.map((point) => [
    `${point.side === 'high' ? '≥' : '≤'} ${point.count}`,
    point.shots,
    point.observed,
    point.low,
    point.high,
    point.fitted,
    point.chernoff,
    point.meanChernoff,
    point.hoeffding
  ])
});
