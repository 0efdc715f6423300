import type { Format } from './format';
import { HistogramBuilder } from './histogram-builder';
import { readLump } from './number/read-lump';
import { readOpening } from './number/read-opening';
import { readWholeNumber } from './number/read-whole-number';
import type { Source } from './source';
import { decideMarks, MarkTally } from './table/decide-marks';
import { columnsOf, type Group, groupRows } from './table/group-rows';
import { totalWords } from './table/header-words';
import { normaliseName } from './table/normalise-name';
import { noteNumbered } from './table/note-numbered';
import { NumberReader } from './table/number-reader';
import { placeCell } from './table/place-cell';
import type { Table } from './table/read-table';
import { trialsLimit } from './trials-limit';
import type { Dataset } from './types';

/** A table with a column of counts and one of numbers of shots; more columns are conditions. */
export const counts: Format = {
  id: 'counts',
  label: 'Table: count, number of shots',
  claims: (source) => source.table()?.format.value === 'counts',
  read(source) {
    const table = source.table();
    if (!table) return { datasets: [], notes: [] };
    const columns: Columns = {
      count: columnsOf(source, 'count')[0],
      shots: columnsOf(source, 'frequency')[0]
    };
    const tally = new MarkTally();
    const style = decideMarks(table.sheet, [columns.count, columns.shots], source.options);
    const numbers = new NumberReader(source, table, style, tally);
    const notes: string[] = [];
    const datasets = groupRows(source, table).map((group) =>
      readGroup(source, table, group, columns, numbers, notes)
    );
    Object.assign(source.reading, tally.report(source.options));
    return { datasets, notes: [...noteNumbered(table), ...tally.notes(), ...notes] };
  }
};

interface Columns {
  count: number;
  shots: number;
}

function readGroup(
  source: Source,
  table: Table,
  group: Group,
  columns: Columns,
  numbers: NumberReader,
  notes: string[]
): Dataset {
  const builder = new HistogramBuilder(source.problems, trialsLimit(source.options, group.suggested));
  let total: { row: number; shots: number } | null = null;
  const problemsBefore = source.problems.kept.length;
  for (const row of group.rows) {
    const cell = table.sheet.rows[row][columns.count];
    const place = () => placeCell(table, row, columns.count);
    const plain = readWholeNumber(cell, numbers.style).ok;
    const lump = plain ? null : readLump(cell, numbers.style);
    const below = plain || lump !== null ? null : readOpening(cell, numbers.style);
    const isTotal = !plain && lump === null && below === null && totalWords.has(normaliseName(cell));
    const count = lump ?? below ?? (isTotal ? 0 : numbers.read(row, columns.count, 'counts'));
    const shots = numbers.read(row, columns.shots, 'numbers of shots');
    if (count === null || shots === null) continue;
    if (isTotal) total = { row, shots };
    else builder.add(count, shots, lump !== null ? 'lump' : below !== null ? 'below' : 'one', place);
  }
  const clean = source.problems.kept.length === problemsBefore;
  if (total && clean) checkTotal(source, table, total, builder.shots, columns, notes);
  const several = Object.keys(group.conditions).length > 0;
  const data = builder.finish(
    several ? ` for ${group.name}` : '',
    table.sheet.lines[group.rows[0]] ?? null,
    clean
  );
  source.reading.lump ??= builder.lumped;
  if (builder.opened) source.reading.below ??= builder.opened;
  return { name: group.name, conditions: group.conditions, data, suggested: group.suggested };
}

/** A closing row "total" is left out when it agrees with the others, and refused when it does not. */
function checkTotal(
  source: Source,
  table: Table,
  total: { row: number; shots: number },
  sum: number,
  columns: Columns,
  notes: string[]
): void {
  const line = table.sheet.lines[total.row];
  if (total.shots === sum) {
    notes.push(`Line ${line} is the total of the others, and agrees with them; it is not a count.`);
    return;
  }
  source.problems.add(() => ({
    ...placeCell(table, total.row, columns.shots),
    message: `This row says that there are ${total.shots} shots in total, but the others add up to ${sum}.`,
    fix: 'Correct the row that is wrong, or take the total out.'
  }));
}
