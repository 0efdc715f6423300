import { SOURCES, TESTS } from '$lib/model/labels';
import type { Summary } from '$lib/model/link/summary';
import type { Interval } from '$lib/stats/types';
import { intervalsTable } from './intervals-table';
import type { Table } from './table';

/** Cumulants with their intervals, where the counts are kept back. */
export const summaryCumulantsTable = ({ moments }: Summary): Table =>
  intervalsTable('quantity', [
    ['κ₁, mean', moments.mean],
    ['κ₂, variance', moments.variance],
    ...(moments.third ? [['κ₃', moments.third] as [string, Interval]] : []),
    ...(moments.fourth ? [['κ₄', moments.fourth] as [string, Interval]] : []),
    ['κ₂/κ₁, Fano factor', moments.fano],
    ['variance over ceiling', moments.dispersion]
  ]);

/** The tests, where the counts are kept back. */
export const summaryTestsTable = ({ tests }: Summary): Table => ({
  columns: [
    { title: 'test', kind: 'text' },
    { title: 'p', kind: 'number' },
    { title: 'p, all tests', kind: 'number' },
    { title: 'from', kind: 'text' }
  ],
  rows: tests.map((test) => [TESTS[test.id], test.p, test.pAdjusted, SOURCES[test.source]])
});
