import type { TrialsPart } from '$lib/stats/sensitivity/types';
import type { Table } from './table';

/** The numbers behind the chart of variance over ceiling against N. */
export const trialsTable = ({ points }: TrialsPart): Table => ({
  columns: [
    { title: 'N', kind: 'text' },
    { title: 'ceiling', kind: 'number' },
    { title: 'variance over ceiling', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: points.map(({ trials, ceiling, dispersion }) => [
    trials === null ? 'unknown' : String(trials),
    ceiling,
    dispersion.value,
    dispersion.low,
    dispersion.high
  ])
});
