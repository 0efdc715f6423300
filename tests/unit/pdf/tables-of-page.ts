import { alignedColumn } from '$lib/charts/aligned-column';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { batchesTable } from '$lib/charts/drift-table';
import { emptyAsideTable, emptyAsideTests } from '$lib/charts/empty-aside-table';
import { fitTable } from '$lib/charts/fit-table';
import { levelsTable } from '$lib/charts/levels-table';
import { rateSpreadTable } from '$lib/charts/rate-spread-table';
import { referencesTable } from '$lib/charts/references-table';
import type { Table } from '$lib/charts/table';
import { FIGURES } from '$lib/page/figures/figures';
import type { Diagnosis } from '$lib/stats/types';
import { plainSpaces } from './read-pdf';

/** Cells as the page prints them, row by row. */
export function printed({ columns, rows }: Table): string[][] {
  const texts = columns.map(({ kind }, i) =>
    alignedColumn(
      rows.map((row) => row[i]),
      kind
    ).map((cell) => plainSpaces(cell).replace(/([≤≥]) /g, '$1'))
  );
  return rows.map((_, row) => texts.map((column) => column[row]));
}

/** Every table of the page, those behind its charts and those in its text, and those that print has besides. */
export function tablesOfPage(document: Diagnosis): [name: string, table: Table][] {
  const { drift, emptyAside, misread } = document.nuisances ?? {};
  return [
    ...Object.entries(FIGURES).flatMap(([kind, make]): [string, Table][] => {
      const table = make(document)?.table;
      return table ? [[kind, table]] : [];
    }),
    ['levels', levelsTable(document)],
    ['references', referencesTable(document)],
    ['cumulants', cumulantsTable(document)],
    ...(drift ? [['batches', batchesTable(drift)] as [string, Table]] : []),
    ['fit', fitTable(document)],
    ...(emptyAside
      ? ([
          ['empty shots aside', emptyAsideTable(emptyAside)],
          ['tests of the rest', emptyAsideTests(emptyAside)]
        ] as [string, Table][])
      : []),
    ...(misread?.spread ? [['misread rates', rateSpreadTable(misread.spread)] as [string, Table]] : [])
  ];
}

/** Tables that the PDF sets apart or in part, by their columns: the name of a row is told with each part of it. */
export const PARTS: Record<string, number[][]> = {
  // Without the size of a flag, which is a sentence.
  tests: [[0, 1, 2, 3, 4, 5, 6]],
  explanations: [
    [0, 3, 4, 5, 1, 2, 6, 17, 7, 8, 9],
    [0, 10, 11, 12, 13, 14, 15, 16]
  ]
};

/** Rows that are no numbers of the document: sentences of flags, and the curve that a chart draws as its edge. */
export const isApart = (kind: string, [name]: string[]): boolean =>
  (kind === 'tests' && name.startsWith('flag: ')) || (kind === 'region' && name === 'region');

/** Counts never seen and hardly expected are left out of a long table, and the PDF says so. */
export const isUnseen = (kind: string, row: string[]): boolean =>
  kind === 'rate' ? row[2] === '–' : ['distribution', 'tails'].includes(kind) && row[1] === '0';
