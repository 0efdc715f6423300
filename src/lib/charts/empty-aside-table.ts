import type { EmptyAside } from '$lib/stats/truncation/empty-aside';
import type { Table } from './table';

/** The shots with at least one defect, tested by themselves. */
export const emptyAsideTable = (aside: EmptyAside): Table => ({
  columns: [
    { title: 'shots', kind: 'whole' },
    { title: 'mean', kind: 'number' },
    { title: 'ceiling', kind: 'number' },
    { title: 'variance over ceiling', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'p', kind: 'number' },
    { title: 'smallest p', kind: 'number' }
  ],
  rows: [
    [
      aside.shots,
      aside.mean,
      aside.ceiling,
      aside.dispersion.value,
      aside.dispersion.low,
      aside.dispersion.high,
      aside.p,
      aside.smallestP
    ]
  ]
});
