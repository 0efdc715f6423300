import { SOURCES, TESTS } from '$lib/model/labels';
import type { Summary } from '$lib/model/link/summary';
import type { Interval } from '$lib/stats/types';
import type { Table } from './table';

const row = (name: string, { value, low, high }: Interval) => [name, value, low, high];

/** Cumulants with their intervals, where the counts are kept back. */
export const summaryCumulantsTable = ({ moments }: Summary): Table => ({
  columns: [
    { title: 'quantity', kind: 'text' },
    { title: 'value', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: [
    row('κ₁, mean', moments.mean),
    row('κ₂, variance', moments.variance),
    ...(moments.third ? [row('κ₃', moments.third)] : []),
    ...(moments.fourth ? [row('κ₄', moments.fourth)] : []),
    row('κ₂/κ₁, Fano factor', moments.fano),
    row('variance over ceiling', moments.dispersion)
  ]
});

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
