import { readWholeNumber } from '../number/read-whole-number';
import type { Source } from '../source';
import { columnsOf, type Group } from './group-rows';
import { placeCell } from './place-cell';
import type { Table } from './read-table';

/**
 * Rows of a group in the order in which the shots were taken.
 *
 * Without a shot column, or with one that holds no whole numbers (time stamps, labels), that is the
 * order of the file. With one it is the order of the shot numbers: over the whole group when no
 * number repeats, else batch by batch. The same shot twice is refused, since one shot counted
 * twice is the commonest slip when files are pasted together.
 */
export function orderShots(source: Source, table: Table, group: Group, notes: string[]): number[] {
  const [column] = columnsOf(source, 'shot');
  if (column === undefined) return group.rows;
  const { rows } = table.sheet;
  const shots = new Float64Array(group.rows.length);
  for (const [index, row] of group.rows.entries()) {
    const read = readWholeNumber(rows[row][column], { decimal: null, thousands: null });
    if (!read.ok) return group.rows;
    shots[index] = read.value;
  }
  if (shots.every((shot, index) => index === 0 || shot > shots[index - 1])) return group.rows;
  const batches = columnsOf(source, 'batch');
  const unique = new Set(shots).size === group.rows.length;
  const rank = new Map<string, number>();
  const batchOf = (row: number): number => {
    if (unique) return 0;
    const key = batches.map((batch) => rows[row][batch]).join('\u0000');
    const known = rank.get(key) ?? rank.size;
    rank.set(key, known);
    return known;
  };
  const keyed = group.rows.map((row, index) => ({ row, batch: batchOf(row), shot: shots[index] }));
  const sorted = keyed.sort((a, b) => a.batch - b.batch || a.shot - b.shot);
  for (let index = 1; index < sorted.length; index += 1) {
    const [before, here] = [sorted[index - 1], sorted[index]];
    if (before.batch !== here.batch || before.shot !== here.shot) continue;
    source.problems.add(() => ({
      ...placeCell(table, here.row, column),
      message: `Shot ${here.shot} is given twice: here and on line ${table.sheet.lines[before.row]}.`,
      fix: 'Take one of the rows out, or say that this column is to be ignored.'
    }));
  }
  if (sorted.some(({ row }, index) => row !== group.rows[index])) {
    notes.push(`The rows${group.name ? ` of ${group.name}` : ''} are put in the order of the shot numbers.`);
  }
  return sorted.map(({ row }) => row);
}
