import type { Diagnosis, TestId } from '$lib/stats/types';
import type { Table } from './table';

/** Every test of the document. */
export const testsTable = ({ tests }: Diagnosis, names: Record<TestId, string>): Table => ({
  columns: [
    { title: 'test', kind: 'text' },
    { title: 'statistic', kind: 'number' },
    { title: 'p', kind: 'number' },
    { title: 'p, all tests', kind: 'number' },
    { title: 'smallest p', kind: 'number' },
    { title: 'from', kind: 'text' },
    { title: 'resamples', kind: 'whole' }
  ],
  rows: tests.map((test) => [
    names[test.id],
    test.statistic,
    test.p,
    test.pAdjusted,
    test.smallestP,
    test.source,
    test.resamples
  ])
});
