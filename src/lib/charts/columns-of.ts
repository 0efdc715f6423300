import type { Table } from './table';

/** Some columns of a table, in the order asked for; a title that it has not is an error. */
export function columnsOf({ columns, rows }: Table, titles: string[]): Table {
  const at = titles.map((title) => {
    const index = columns.findIndex((column) => column.title === title);
    if (index < 0) throw new Error(`No column is called ${title}.`);
    return index;
  });
  return { columns: at.map((i) => columns[i]), rows: rows.map((row) => at.map((i) => row[i])) };
}
