import { csvCell } from './csv-cell';

/** One value of a table; null is left empty. */
export type CsvValue = string | number | null;

/**
 * A table as a CSV file: RFC 4180, lines that end in CR LF, a point for decimals, numbers in full as JSON writes them,
 * so that reading them gives the same values. Texts go through csvCell: none becomes a formula.
 */
export const csvTable = (lines: CsvValue[][]): string =>
  lines.map((line) => `${line.map(cellOf).join(',')}\r\n`).join('');

const cellOf = (value: CsvValue): string =>
  value === null ? '' : typeof value === 'number' ? String(value) : csvCell(value);
