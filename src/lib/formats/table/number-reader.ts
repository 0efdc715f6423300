import { readWholeNumber, type NumberStyle } from '../number/read-whole-number';
import { sayBadNumber } from '../number/say-bad-number';
import type { Source } from '../source';
import type { MarkTally } from './decide-marks';
import { placeCell } from './place-cell';
import type { Table } from './read-table';

/** Reads whole numbers out of a table's cells, reporting the bad ones with their place. */
export class NumberReader {
  constructor(
    private readonly source: Source,
    private readonly table: Table,
    readonly style: NumberStyle,
    readonly tally: MarkTally
  ) {}

  /** The cell's number, or null after a problem was reported. `what` as in `sayBadNumber`. */
  read(row: number, column: number, what: string): number | null {
    const cell = this.table.sheet.rows[row][column];
    const read = readWholeNumber(cell, this.style);
    if (read.ok) {
      if (read.written !== 'plain') this.tally.note(read);
      return read.value;
    }
    this.source.problems.add(() => ({
      ...placeCell(this.table, row, column),
      ...sayBadNumber(read.bad, cell, what)
    }));
    return null;
  }
}
