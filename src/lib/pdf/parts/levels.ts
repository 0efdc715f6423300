import { alignedColumn } from '$lib/charts/aligned-column';
import { levelsTable } from '$lib/charts/levels-table';
import type { Diagnosis } from '$lib/stats/types';
import type { Block } from '../blocks/blocks';

/** Rows of a table in print; more are told in a paragraph, so that none is left out. */
const MOST = 40;

/** The best law by its distinct probabilities: every one of them, since a law is checked by all of it. */
export function levelsBlocks({ fit }: { fit: Pick<Diagnosis['fit'], 'levels' | 'poissonPart'> }): Block[] {
  const table = levelsTable({ fit });
  const caption = 'The best law, by its distinct probabilities';
  if (table.rows.length === 0) return [];
  if (table.rows.length <= MOST) return [{ kind: 'table', caption, table }];
  const [many, each] = [1, 2].map((column) =>
    alignedColumn(
      table.rows.map((row) => row[column]),
      table.columns[column].kind
    ).map((text) => text.trim())
  );
  const told = table.rows.map(([part], i) =>
    many[i] === '' ? `${part} ${each[i]}` : `${many[i]} × ${each[i]}`
  );
  return [
    { kind: 'paragraph', text: `${caption}, each after the number of its trials`, look: 'strong' },
    { kind: 'paragraph', text: `${told.join('; ')}.`, look: 'small' }
  ];
}
