/** A table with its header taken off; cells trimmed, all rows as wide as `width`. */
export interface Sheet {
  rows: string[][];
  /** Line of each row, from 1. */
  lines: number[];
  names: (string | null)[];
  width: number;
  /** True when one line of numbers was turned into a column: row i is then cell i of that line. */
  turned: boolean;
}
