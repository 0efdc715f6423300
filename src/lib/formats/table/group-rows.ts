import { maxDatasets } from '../limits';
import { readWholeNumber } from '../number/read-whole-number';
import type { Source } from '../source';
import type { Role, Suggested } from '../types';
import { classifyName } from './classify-name';
import { placeCell } from './place-cell';
import type { Table } from './read-table';

/** Rows of one combination of conditions. */
export interface Group {
  name: string;
  conditions: Record<string, string>;
  suggested: Suggested;
  rows: number[];
}

/** Columns of a role, from 0. */
export function columnsOf(source: Source, role: Role): number[] {
  return source.reading.columns.flatMap(({ column, role: { value } }) =>
    value === role ? [column - 1] : []
  );
}

/**
 * Divides the rows of a table by its condition columns, in the order in which the combinations
 * first appear. A table without conditions is one group.
 */
export function groupRows(source: Source, table: Table): Group[] {
  const { sheet } = table;
  const columns = columnsOf(source, 'condition');
  const name = (column: number) => {
    const own = sheet.names[column] ?? `column ${column + 1}`;
    return sheet.names.indexOf(own) === column || !sheet.names[column] ? own : `${own} (${column + 1})`;
  };
  if (columns.length === 0) {
    return [{ name: source.name, conditions: {}, suggested: {}, rows: sheet.rows.map((_, row) => row) }];
  }
  const groups = new Map<string, Group>();
  for (const [index, row] of sheet.rows.entries()) {
    const empty = columns.find((column) => row[column] === '');
    if (empty !== undefined) {
      source.problems.add(() => ({
        ...placeCell(table, index, empty),
        message: `The ${name(empty)} of this row is empty.`,
        fix: `Fill it, or say that the column "${name(empty)}" is to be ignored.`
      }));
      continue;
    }
    const key = columns.map((column) => row[column]).join('\u0000');
    let group = groups.get(key);
    if (!group) {
      if (groups.size === maxDatasets) {
        const most = widest(table, columns);
        source.problems.whole(
          `There are more than ${maxDatasets} combinations of ${columns.map(name).join(', ')}.`,
          `Say what the column "${name(most)}" holds (a shot number, a batch, or nothing needed here).`
        );
        break;
      }
      group = makeGroup(columns.map((column) => [name(column), row[column]]));
      groups.set(key, group);
    }
    group.rows.push(index);
  }
  return [...groups.values()];
}

function makeGroup(entries: [string, string][]): Group {
  const suggested: Suggested = {};
  for (const [name, value] of entries) {
    if (classifyName(name) !== 'trials') continue;
    const read = readWholeNumber(value, { decimal: null, thousands: null });
    if (read.ok) suggested.trials = read.value;
  }
  return {
    name: entries.map(([name, value]) => `${name} ${value}`).join(', '),
    // fromEntries defines own properties, so a column called __proto__ stays a plain entry.
    conditions: Object.fromEntries(entries),
    suggested,
    rows: []
  };
}

/** The condition with the most different values. */
function widest(table: Table, columns: number[]): number {
  const values = (column: number) => new Set(table.sheet.rows.map((row) => row[column])).size;
  return columns.map((column) => ({ column, size: values(column) })).sort((a, b) => b.size - a.size)[0]
    .column;
}
