import { defaultMaxRows } from '../limits';
import type { ProblemList } from '../problem-list';
import type { FormatId, Guess, ReadOptions, Reading } from '../types';
import { type BuiltSheet, buildSheet } from './build-sheet';
import { decideRoles } from './decide-roles';
import type { Sheet } from './sheet';

/** A table whose columns are known, ready for the format that reads it. */
export interface Table {
  sheet: Sheet;
  built: BuiltSheet;
  format: Guess<FormatId>;
  /** All counts of a long plain list (`plainSource`), which then has no rows in `sheet` beyond the first lines. */
  plain: Uint32Array | null;
}

/** Reads a text as a table; what was decided goes into `reading`, what is wrong into `problems`. */
export function readTable(
  text: string,
  options: ReadOptions,
  reading: Reading,
  problems: ProblemList
): Table | null {
  const maxRows = options.maxRows ?? defaultMaxRows;
  const lines = countLines(text);
  if (lines > maxRows) {
    problems.whole(
      `There are ${lines} lines, above the limit of ${maxRows} for a table.`,
      'Sum shots of equal count into a histogram, or give one plain whole number a line.'
    );
    return null;
  }
  return buildTable(text, options, reading, problems);
}

function buildTable(
  text: string,
  options: ReadOptions,
  reading: Reading,
  problems: ProblemList
): Table | null {
  const built = buildSheet(text, options, problems);
  Object.assign(reading, {
    separator: built.separator,
    header: built.header,
    blankLines: built.blankLines,
    commentLines: built.commentLines
  });
  if (!built.sheet) return null;
  reading.rows = built.sheet.rows.length;
  const decision = decideRoles(built.sheet, options);
  reading.columns = decision.columns;
  if (!decision.ok) {
    problems.add(() => decision.problem);
    return null;
  }
  reading.format = decision.format;
  return { sheet: built.sheet, built, format: decision.format, plain: null };
}

function countLines(text: string): number {
  let lines = 1;
  for (let at = 0; at < text.length; at += 1) {
    if (text.charCodeAt(at) === 10) lines += 1;
  }
  return lines;
}
