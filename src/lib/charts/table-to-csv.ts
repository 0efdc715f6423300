import type { Table } from './table';

/** Cells that hold a separator, a quote or a line end are quoted; RFC 4180. */
const cell = (value: number | string | null): string => {
  if (value === null) return '';
  const text = String(value);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
};

/** The table as CSV with every digit, a point for decimals, and a header; empty cells where there is no value. */
export function tableToCsv(table: Table): string {
  const lines = [table.columns.map(({ title }) => title), ...table.rows];
  return lines.map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}
