import type { Diagnosis } from '$lib/stats/types';
import { bytesOfText, textOfBytes } from './packed-bytes';

/** Rows of a document below which packing saves nothing. */
const LONG = 500;

type Cell = number | string | boolean | null;

/** One column: numbers as the bytes of doubles, so that none loses a digit; a null is not a number. */
type Column = { key: string } & ({ doubles: string } | { same: Cell } | { cells: Cell[] });

interface PackedRows {
  length: number;
  columns: Column[];
}

/** A document on its way from server to page, its three long lists as columns. */
export interface PackedDocument {
  packed: object;
}

/**
 * A document whose lists are long, packed for the way to the page: 9 MB of ten thousand counts become 2.5; false for
 * anything else, which goes as it is.
 */
export function packDocument(value: unknown): PackedDocument | false {
  if (!isLong(value)) return false;
  const { distribution, rate, tails } = value;
  return {
    packed: {
      ...value,
      distribution: packRows(distribution),
      rate: { ...rate, points: packRows(rate.points) },
      tails: { ...tails, points: packRows(tails.points) }
    }
  };
}

/** The document again: the same values in the same order. */
export function unpackDocument({ packed }: PackedDocument): Diagnosis {
  const document = packed as Diagnosis;
  const rows = (of: unknown) => unpackRows(of as PackedRows);
  return {
    ...document,
    distribution: rows(document.distribution),
    rate: { ...document.rate, points: rows(document.rate.points) },
    tails: { ...document.tails, points: rows(document.tails.points) }
  } as Diagnosis;
}

function isLong(value: unknown): value is Diagnosis {
  const document = value as Partial<Diagnosis> | null;
  return (
    typeof value === 'object' &&
    document?.format === 'severalty.diagnosis/1' &&
    Array.isArray(document.distribution) &&
    document.distribution.length >= LONG
  );
}

function packRows(list: object[]): PackedRows {
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

function unpackRows({ length, columns }: PackedRows): object[] {
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
