import { csvTable } from '$lib/model/exports/csv-table';
import type { Table } from './table';

/** The table as CSV with every digit, a point for decimals, and a header; empty cells where there is no value. */
export const tableToCsv = ({ columns, rows }: Table): string =>
  csvTable([columns.map(({ title }) => title), ...rows]);
