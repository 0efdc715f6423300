import type { EmptyAside } from '$lib/stats/truncation/empty-aside';
import { TESTS } from '$lib/model/labels';
import { columnsOf } from './columns-of';
import type { Table } from './table';
import { testsTable } from './tests-table';

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

/** Each test of these shots; no rows in a document that knew their variance alone. */
export const emptyAsideTests = ({ tests }: EmptyAside): Table =>
  columnsOf(testsTable({ tests, tails: { certificate: null }, flags: [] }, TESTS), [
    'test',
    'statistic',
    'p',
    'p, all tests',
    'smallest p',
    'resamples'
  ]);

/** What stands over it. */
export const REST_CAPTION = 'Tests of the shots with at least one defect, against independent trials so cut';
