import Papa from 'papaparse';
import type { Separator } from '../types';
import { joinSpaced } from './join-spaced';
import { separators, wholeLine } from './separators';

/** Cells of all lines that hold any, with the line each row starts on. */
export interface ParsedTable {
  rows: string[][];
  lines: number[];
  /** Lines without a single filled cell, emptied comments included. */
  emptyLines: number;
  /** First line on which a quotation mark opens that is never closed or is out of place. */
  badQuote: number | null;
}

/**
 * Splits a clean text (see `cleanText`) into rows of trimmed cells.
 *
 * The separator is settled before; the parser's own detection is not used, since it cannot say why.
 * A cell may span lines inside quotation marks; line numbers stay right because they are counted
 * from the cells themselves.
 */
export function parseTable(text: string, separator: Separator): ParsedTable {
  const spaced = separator === 'spaces';
  const named = separators.find(({ id }) => id === separator);
  const input = spaced ? text.split('\n').map(joinSpaced).join('\n') : text;
  const parsed = Papa.parse<string[]>(input, {
    delimiter: spaced ? '\t' : (named?.character ?? wholeLine),
    newline: '\n',
    quoteChar: '"',
    header: false,
    skipEmptyLines: false
  });
  const rows: string[][] = [];
  const lines: number[] = [];
  let emptyLines = 0;
  let line = 1;
  const starts = parsed.errors.length > 0 ? new Map<number, number>() : null;
  for (let index = 0; index < parsed.data.length; index += 1) {
    const row = parsed.data[index];
    starts?.set(index, line);
    const start = line;
    line += 1;
    let filled = false;
    for (let cell = 0; cell < row.length; cell += 1) {
      const value = row[cell];
      if (value.includes('\n')) line += value.split('\n').length - 1;
      row[cell] = value.trim();
      if (row[cell] !== '') filled = true;
    }
    if (filled) {
      rows.push(row);
      lines.push(start);
    } else if (index < parsed.data.length - 1 || row.length > 1) emptyLines += 1;
  }
  const quoteError = parsed.errors.find(({ type }) => type === 'Quotes');
  const badQuote = quoteError ? (starts?.get(quoteError.row ?? 0) ?? 1) : null;
  return { rows, lines, emptyLines, badQuote };
}
