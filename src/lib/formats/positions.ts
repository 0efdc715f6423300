import type { Format } from './format';
import { HistogramBuilder } from './histogram-builder';
import { decideMarks, MarkTally } from './table/decide-marks';
import { columnsOf } from './table/group-rows';
import { NumberReader } from './table/number-reader';
import { placeCell } from './table/place-cell';
import { trialsLimit } from './trials-limit';

/**
 * One number of shots a line (or in one line), for 0, 1, 2 … defects in that order. Never guessed:
 * such a file looks like a shot list, so the person has to say it.
 */
export const positions: Format = {
  id: 'positions',
  label: 'Numbers of shots with 0, 1, 2 … defects, in this order',
  claims: () => false,
  read(source) {
    const table = source.table();
    if (!table) return { datasets: [], notes: [] };
    const [column] = columnsOf(source, 'frequency');
    const tally = new MarkTally();
    const numbers = new NumberReader(
      source,
      table,
      decideMarks(table.sheet, [column], source.options),
      tally
    );
    const builder = new HistogramBuilder(source.problems, trialsLimit(source.options, {}));
    for (const row of table.sheet.rows.keys()) {
      const shots = numbers.read(row, column, 'numbers of shots');
      if (shots !== null) builder.add(row, shots, 'one', () => placeCell(table, row, column));
    }
    const data = builder.finish('', table.sheet.lines[0] ?? null, !source.problems.any);
    Object.assign(source.reading, tally.report(source.options));
    return { datasets: [{ name: source.name, conditions: {}, data, suggested: {} }], notes: tally.notes() };
  }
};
