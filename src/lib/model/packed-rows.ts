import { bytesOfText, textOfBytes } from './packed-bytes';

type Cell = number | string | boolean | null;

/** One column: numbers as the bytes of doubles, so that none loses a digit; a null is not a number. */
type Column = { key: string } & ({ doubles: string } | { same: Cell } | { cells: Cell[] });

/** Rows of a document as columns. */
export interface PackedRows {
  length: number;
  columns: Column[];
}

/** Rows of one shape as columns. */
export function packRows(list: object[]): PackedRows {
  const rows = list as Record<string, Cell>[];
  const columns = Object.keys(rows[0] ?? {}).map((key): Column => {
    const cells = rows.map((row) => row[key]);
    if (cells.every((cell) => Object.is(cell, cells[0]))) return { key, same: cells[0] };
    if (!cells.every((cell) => cell === null || typeof cell === 'number')) return { key, cells };
    const bytes = new DataView(new ArrayBuffer(8 * cells.length));
    cells.forEach((cell, i) => bytes.setFloat64(8 * i, cell === null ? NaN : Number(cell), true));
    return { key, doubles: textOfBytes(new Uint8Array(bytes.buffer)) };
  });
  return { length: rows.length, columns };
}

/** The rows again: the same values in the same order. */
export function unpackRows({ length, columns }: PackedRows): object[] {
  const readers = columns.map((column) => [column.key, reader(column)] as const);
  return Array.from({ length }, (_, i) => {
    const row: Record<string, Cell> = {};
    for (const [key, cell] of readers) row[key] = cell(i);
    return row;
  });
}

function reader(column: Column): (row: number) => Cell {
  if ('same' in column) return () => column.same;
  if ('cells' in column) return (row) => column.cells[row];
  const bytes = new DataView(bytesOfText(column.doubles).buffer);
  return (row) => {
    const value = bytes.getFloat64(8 * row, true);
    return Number.isNaN(value) ? null : value;
  };
}
