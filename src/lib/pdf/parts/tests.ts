import type { Table } from '$lib/charts/table';
import { testsPicture } from '$lib/charts/tests-picture';
import { columnsOf } from '$lib/charts/columns-of';
import { testsTable } from '$lib/charts/tests-table';
import { testsTitle } from '$lib/charts/tests-title';
import { TESTS } from '$lib/model/labels';
import { sayDrawnFrom } from '$lib/model/report/say-drawn-from';
import { sayOrigin } from '$lib/model/report/say-origin';
import { sayHowOften } from '$lib/model/say-p';
import type { Diagnosis } from '$lib/stats/types';
import type { Block, Part } from '../blocks/blocks';
import { NOTES } from './notes';

/** The tests: how surprising each is, in words and numbers, and which did not run. */
export function testsPart(document: Diagnosis): Part {
  const { tests, notRun } = document;
  const ran: Block[] =
    tests.length === 0
      ? []
      : [
          {
            kind: 'figure',
            what: 'Chart of the tests, one a line',
            title: testsTitle(document),
            draw: (size) => testsPicture(document, size, TESTS)
          },
          {
            kind: 'table',
            caption: 'If defects formed independently, a result as extreme as in each test',
            table: testsInPrint(document),
            digits: 2,
            under: tests.map(({ p, smallestP }) => sayHowOften(p, smallestP))
          },
          { kind: 'table', caption: 'The tests and the certificate in full', table: testsInFull(document) }
        ];
  const left: Block[] =
    notRun.length === 0
      ? []
      : [
          { kind: 'paragraph', text: 'Not run', look: 'strong' },
          { kind: 'list', items: notRun.map(({ id, reason }) => `${TESTS[id]}: ${reason}`) }
        ];
  return {
    title: 'Tests',
    rows: [{ blocks: [...ran, ...left], notes: [NOTES.severalTests, NOTES.origin(sayDrawnFrom(document))] }]
  };
}

const testsInPrint = ({ tests }: Diagnosis): Table => ({
  columns: [
    { title: 'test', kind: 'text' },
    { title: 'p', kind: 'number' },
    { title: 'p, all tests', kind: 'number' },
    { title: 'smallest p', kind: 'number' },
    { title: 'from', kind: 'text' }
  ],
  rows: tests.map((test) => [TESTS[test.id], test.p, test.pAdjusted, test.smallestP, sayOrigin(test)])
});

/** What stands behind the chart of the page: without the flags, which have a part of their own. */
function testsInFull(document: Diagnosis): Table {
  const whole = testsTable({ ...document, flags: [] }, TESTS);
  return columnsOf(whole, ['test', 'statistic', 'p', 'p, all tests', 'smallest p', 'from', 'resamples']);
}
