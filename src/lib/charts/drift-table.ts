import type { DriftPart } from '$lib/stats/drift/types';
import type { Table } from './table';

/** The numbers behind the chart of means over time. */
export const driftTable = ({ means }: DriftPart): Table => ({
  columns: [
    { title: 'first shot', kind: 'whole' },
    { title: 'last shot', kind: 'whole' },
    { title: 'mean', kind: 'number' },
    { title: 'lower limit', kind: 'number' },
    { title: 'upper limit', kind: 'number' }
  ],
  rows: means.map(({ from, to, mean, low, high }) => [from + 1, to, mean, low, high])
});

/** The batches one by one. */
export const batchesTable = ({ split }: DriftPart): Table => ({
  columns: [
    { title: 'batch', kind: 'whole' },
    { title: 'shots', kind: 'whole' },
    { title: 'mean', kind: 'number' },
    { title: 'variance over ceiling', kind: 'number' },
    { title: 'p', kind: 'number' }
  ],
  rows: (split?.each ?? []).map(({ batch, shots, mean, dispersion, p }) => [
    batch,
    shots,
    mean,
    dispersion,
    p
  ])
});
