import { defaultMaxRows } from '../limits';
import { ProblemList } from '../problem-list';
import type { FormatId, Guess, ReadOptions, Reading } from '../types';
import { type BuiltSheet, buildSheet } from './build-sheet';
import { decideRoles } from './decide-roles';
import { scanPlainList } from './scan-plain-list';
import type { Sheet } from './sheet';

/** A table whose columns are known, ready for the format that reads it. */
export interface Table {
  sheet: Sheet;
  built: BuiltSheet;
  format: Guess<FormatId>;
  /** All counts of a long plain list, which then has no rows in `sheet` beyond the first lines. */
  plain: Uint32Array | null;
}

/** Texts shorter than this are read by the table parser whatever they hold; it takes 10 ms. */
const longText = 300_000;

/** Reads a text as a table; what was decided goes into `reading`, what is wrong into `problems`. */
export function readTable(
  text: string,
  options: ReadOptions,
  reading: Reading,
  problems: ProblemList
): Table | null {
  const plain = text.length > longText ? readPlainTable(text, options, reading) : null;
  if (plain) return plain;
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

/** Decides everything from the first lines; then, if they are a plain shot list, scans the rest. */
function readPlainTable(text: string, options: ReadOptions, reading: Reading): Table | null {
  const head = text.slice(0, text.lastIndexOf('\n', 20_000) + 1);
  if (head === '') return null;
  const problems = new ProblemList();
  const found: Reading = { ...reading };
  const table = buildTable(head, options, found, problems);
  const single = table?.sheet.width === 1 && found.columns[0].role.value === 'count' && !table.sheet.turned;
  if (!table || problems.any || !single || table.format.value !== 'shots') return null;
  const scanned = scanPlainList(text, table.sheet.lines[0], options.trials ?? Infinity);
  if (!scanned) return null;
  const { values, blankLines, commentLines } = scanned;
  Object.assign(reading, found, { rows: values.length, blankLines, commentLines });
  return { ...table, plain: values };
}

function countLines(text: string): number {
  let lines = 1;
  for (let at = 0; at < text.length; at += 1) {
    if (text.charCodeAt(at) === 10) lines += 1;
  }
  return lines;
}
