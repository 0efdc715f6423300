import { FLAGS } from '$lib/model/labels';
import type { Diagnosis, TestId } from '$lib/stats/types';
import type { Table } from './table';

/** Every test of the document, the certificate, and the flags that they raise. */
export const testsTable = (
  {
    tests,
    tails,
    flags
  }: Pick<Diagnosis, 'tests' | 'flags'> & { tails: Pick<Diagnosis['tails'], 'certificate'> },
  names: Record<TestId, string>
): Table => ({
  columns: [
    { title: 'test', kind: 'text' },
    { title: 'statistic', kind: 'number' },
    { title: 'p', kind: 'number' },
    { title: 'p, all tests', kind: 'number' },
    { title: 'smallest p', kind: 'number' },
    { title: 'from', kind: 'text' },
    { title: 'resamples', kind: 'whole' },
    { title: 'size', kind: 'text' }
  ],
  rows: [
    ...tests.map((test) => [
      names[test.id],
      test.statistic,
      test.p,
      test.pAdjusted,
      test.smallestP,
      test.source,
      test.resamples,
      ''
    ]),
    ...(tails.certificate
      ? [['exact certificate', null, tails.certificate.p, null, null, 'exact', null, '']]
      : []),
    ...flags.map(({ id, grade, tests: by, size }) => [
      `flag: ${FLAGS[id]}, ${grade === 'shown' ? 'shown' : 'hinted at'}`,
      null,
      null,
      null,
      null,
      by.map((test) => names[test]).join(', '),
      null,
      size
    ])
  ]
});
