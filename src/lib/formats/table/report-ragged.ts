import type { ProblemList } from '../problem-list';
import { lineText } from '../text/place-of';
import type { Separator } from '../types';
import { locateCell } from './locate-cell';
import type { ParsedTable } from './parse-table';

/**
 * Reports every row with more or fewer cells than the table has columns, and returns the others,
 * cut to the width of the table. Empty cells at the end of a row do not count.
 */
export function reportRagged(
  table: ParsedTable,
  width: number,
  separator: Separator,
  text: string,
  problems: ProblemList
): { rows: string[][]; lines: number[] } {
  const rows: string[][] = [];
  const lines: number[] = [];
  for (const [index, row] of table.rows.entries()) {
    let cells = row.length;
    while (cells > width && row[cells - 1] === '') cells -= 1;
    if (cells === width) {
      if (row.length > width) row.length = width;
      rows.push(row);
      lines.push(table.lines[index]);
      continue;
    }
    const line = table.lines[index];
    problems.add(() => ({
      line,
      column:
        cells > width ? locateCell(lineText(text, line), separator, width) : lineText(text, line).length + 1,
      message: `This row has ${cells} ${cells === 1 ? 'cell' : 'cells'} where the others have ${width}.`,
      fix: sayFix(row, width, separator)
    }));
  }
  return { rows, lines };
}

function sayFix(row: string[], width: number, separator: Separator): string {
  const grouped = row.length > width && row.some((cell, index) => index > 0 && /^\d{3}$/.test(cell));
  if (grouped && (separator === 'comma' || separator === 'spaces')) {
    const mark = separator === 'comma' ? 'commas' : 'spaces';
    return `Write numbers without grouping their digits: ${mark} separate the columns here.`;
  }
  if (row.length < width && !row.some((cell) => /\d/.test(cell))) {
    return 'Put # in front of lines that are titles or remarks.';
  }
  return 'Give every row the same number of cells.';
}
