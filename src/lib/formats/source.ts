import { ProblemList } from './problem-list';
import { readTable, type Table } from './table/read-table';
import type { ReadOptions, Reading } from './types';

/** A text on its way through the formats: they share its table, its reading and its problems. */
export class Source {
  readonly problems = new ProblemList();
  readonly reading: Reading = {
    encoding: null,
    format: null,
    separator: null,
    header: null,
    columns: [],
    decimal: null,
    thousands: null,
    lump: null,
    rows: 0,
    blankLines: 0,
    commentLines: 0
  };
  private made: Table | null | undefined;

  /** @param text with `\n` line ends. */
  constructor(
    readonly text: string,
    readonly options: ReadOptions
  ) {}

  /** The text as a table, taken apart once; null when it cannot be, and then there are problems. */
  table(): Table | null {
    if (this.made === undefined) {
      this.made = readTable(this.text, this.options, this.reading, this.problems);
    }
    return this.made;
  }

  /** Name of the only dataset of a source that holds one. */
  get name(): string {
    return this.options.name ?? 'counts';
  }
}
