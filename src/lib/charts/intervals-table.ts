import type { Interval } from '$lib/stats/types';
import type { Table } from './table';

/** Values with their intervals, a row each under `what`; a bare number has no interval. */
export const intervalsTable = (
  what: string,
  values: [name: string, value: Interval | number | null][]
): Table => ({
  columns: [
    { title: what, kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: values.map(([name, value]) =>
    value === null || typeof value === 'number'
      ? [name, value, null, null]
      : [name, value.value, value.low, value.high]
  )
});
