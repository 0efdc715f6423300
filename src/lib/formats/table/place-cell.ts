import { lineText } from '../text/place-of';
import { locateCell } from './locate-cell';
import type { Table } from './read-table';

/** Line and character column of a cell of the sheet, both from 1. */
export function placeCell(
  table: Table,
  row: number,
  column: number
): { line: number; column: number | null } {
  const { built, sheet } = table;
  const line = sheet.lines[row];
  const cell = sheet.turned ? row : column;
  return { line, column: locateCell(lineText(built.text, line), built.separator.value, cell) };
}
