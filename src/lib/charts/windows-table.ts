import type { SweepReport } from '$lib/stats/sweep/types';
import type { Table } from './table';

/** The common exponent window by window. */
export const windowsTable = ({ windows }: Pick<SweepReport, 'windows'>): Table => ({
  columns: [
    { title: 'window from', kind: 'number' },
    { title: 'window to', kind: 'number' },
    { title: 'exponent', kind: 'number' },
    { title: 'exponent, low', kind: 'number' },
    { title: 'exponent, high', kind: 'number' },
    { title: 'p of one exponent', kind: 'number' },
    { title: 'p of power laws', kind: 'number' },
    { title: 'p of the whole window’s exponent', kind: 'number' }
  ],
  rows: windows.map(({ from, to, exponent, commonP, lawP, awayP }) => [
    from,
    to,
    exponent.value,
    exponent.low,
    exponent.high,
    commonP,
    lawP,
    awayP ?? null
  ])
});
