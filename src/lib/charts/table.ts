/** What a column holds: it decides how a number is set, never its value. */
export type ColumnKind = 'text' | 'whole' | 'number';

export interface Column {
  title: string;
  kind: ColumnKind;
}

/** The numbers behind a chart, in full, for the as-table view and the CSV file. */
export interface Table {
  columns: Column[];
  rows: (number | string | null)[][];
}
