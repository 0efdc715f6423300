import type { ShotList } from '../stats/types';
import type { Format } from './format';
import { maxCount } from './limits';
import type { Source } from './source';
import { decideMarks, MarkTally } from './table/decide-marks';
import { columnsOf, type Group, groupRows } from './table/group-rows';
import { NumberReader } from './table/number-reader';
import { orderShots } from './table/order-shots';
import { placeCell } from './table/place-cell';
import type { Table } from './table/read-table';
import { trialsLimit } from './trials-limit';
import type { Dataset } from './types';

/** One count a line in the order taken, alone or with the number of the shot and of its batch. */
export const shots: Format = {
  id: 'shots',
  label: 'Shot list: one count a line',
  claims: (source) => source.table()?.format.value === 'shots',
  read(source) {
    const table = source.table();
    if (!table) return { datasets: [], notes: [] };
    const tally = new MarkTally();
    const count = columnsOf(source, 'count')[0];
    const notes: string[] = [];
    if (table.sheet.width === 1 && source.options.format !== 'shots') notes.push(oneColumn);
    const finish = (datasets: Dataset[]) => {
      Object.assign(source.reading, tally.report(source.options));
      return { datasets, notes: [...tally.notes(), ...notes] };
    };
    if (table.plain) {
      const data: ShotList = { kind: 'shots', shots: table.plain, batches: null };
      return finish([{ name: source.name, conditions: {}, data, suggested: {} }]);
    }
    const style = decideMarks(table.sheet, [count], source.options);
    const numbers = new NumberReader(source, table, style, tally);
    return finish(groupRows(source, table).map((group) => readGroup(source, table, group, numbers, notes)));
  }
};

const oneColumn =
  'One column is read as one count a shot. If its lines are numbers of shots with 0, 1, 2 … defects, choose "positions".';

function readGroup(
  source: Source,
  table: Table,
  group: Group,
  numbers: NumberReader,
  notes: string[]
): Dataset {
  const [column] = columnsOf(source, 'count');
  const { trials, why } = trialsLimit(source.options, group.suggested);
  const rows = orderShots(source, table, group, notes);
  const values = new Uint32Array(rows.length);
  for (const [index, row] of rows.entries()) {
    const count = numbers.read(row, column, 'counts of single shots');
    if (count === null) continue;
    if (count > maxCount || (trials !== null && count > trials)) {
      source.problems.add(() => ({
        ...placeCell(table, row, column),
        message:
          trials !== null && count > trials
            ? `The count ${count} is above the ${trials} trials ${why}.`
            : `The count ${count} is too large.`,
        fix: trials === null ? `Counts go up to ${maxCount}.` : 'Correct the count, or the number of trials.'
      }));
    } else values[index] = count;
  }
  const batches = readBatches(source, table, rows);
  return {
    name: group.name,
    conditions: group.conditions,
    data: { kind: 'shots', shots: values, batches },
    suggested: group.suggested
  };
}

/** Batch of each row; several batch columns make one label. Null when there is none. */
function readBatches(source: Source, table: Table, rows: number[]): string[] | null {
  const columns = columnsOf(source, 'batch');
  if (columns.length === 0) return null;
  for (const row of rows) {
    const empty = columns.find((column) => table.sheet.rows[row][column] === '');
    if (empty === undefined) continue;
    source.problems.add(() => ({
      ...placeCell(table, row, empty),
      message: 'The batch of this row is empty.',
      fix: 'Fill it, or say that this column is to be ignored.'
    }));
  }
  return rows.map((row) => columns.map((column) => table.sheet.rows[row][column]).join(' / '));
}
