import type { ProblemList } from '../problem-list';
import type { Guess, ReadOptions, Separator } from '../types';
import { checkShape } from './check-shape';
import { cleanText } from './clean-text';
import { decideHeader, namesInComment } from './decide-header';
import { decideSeparator } from './decide-separator';
import { parseTable } from './parse-table';
import { reportRagged } from './report-ragged';
import { isNumberLike } from './role-draft';
import type { Sheet } from './sheet';

/** A text taken apart into a sheet; `sheet` is null when a problem stands in the way. */
export interface BuiltSheet {
  sheet: Sheet | null;
  /** The text with `\n` line ends, by which problems are located. */
  text: string;
  separator: Guess<Separator>;
  header: Guess<boolean> | null;
  blankLines: number;
  commentLines: number;
}

/** Most frequent width of a row, less the closing columns that are empty in every such row. */
function usualWidth(rows: string[][]): number {
  const tally = new Map<number, number>();
  for (const { length } of rows) tally.set(length, (tally.get(length) ?? 0) + 1);
  const [usual] = [...tally].sort((a, b) => b[1] - a[1] || b[0] - a[0])[0];
  let width = 1;
  for (const row of rows) {
    if (row.length !== usual) continue;
    for (let cell = usual; cell > width; cell -= 1) if (row[cell - 1] !== '') width = cell;
  }
  return width;
}

/** 1 where the last line is a comment without a line end: emptied, it is no line any more. */
function endsInComment(text: string): number {
  const last = text.slice(text.lastIndexOf('\n') + 1);
  return last.trimStart().startsWith('#') ? 1 : 0;
}

/**
 * Splits a text into a sheet: separator, rows, header, with ragged rows reported and left out.
 */
export function buildSheet(raw: string, options: ReadOptions, problems: ProblemList): BuiltSheet {
  const clean = cleanText(raw);
  const separator = decideSeparator(clean.head, options.separator);
  const table = parseTable(clean.text, separator.value);
  if (separator.from === 'stated') {
    table.rows.shift();
    table.lines.shift();
  }
  const built: BuiltSheet = {
    sheet: null,
    text: clean.text,
    separator,
    header: null,
    blankLines: Math.max(0, table.emptyLines + endsInComment(raw) - clean.commentLines),
    commentLines: clean.commentLines
  };
  if (table.badQuote !== null) {
    problems.whole(
      'A quotation mark is opened and not closed, or stands inside a cell.',
      'Take the quotation marks out.',
      table.badQuote
    );
    return built;
  }
  if (table.rows.length === 0) {
    const only = clean.commentLines > 0 ? 'The file holds comments only.' : 'The file is empty.';
    problems.whole(only, 'Give a table of counts and numbers of shots.', 1);
    return built;
  }
  const width = usualWidth(table.rows);
  const format = options.format ?? 'auto';
  if (!checkShape(table, width, separator, format, problems)) return built;
  if (table.rows.length === 1 && width > 2 && table.rows[0].every(isNumberLike)) {
    built.header = { value: false, from: 'guessed', why: 'there is one line, of numbers' };
    const rows = table.rows[0].slice(0, width).map((cell) => [cell]);
    built.sheet = { rows, lines: rows.map(() => table.lines[0]), names: [null], width: 1, turned: true };
    return built;
  }
  built.header = decideHeader(table.rows[0], options.header);
  const [firstLine] = table.lines;
  let names: (string | null)[] = Array.from({ length: width }, () => null);
  if (built.header.value) {
    const [row] = table.rows.splice(0, 1);
    table.lines.splice(0, 1);
    names = names.map((_, column) => row[column] || null);
  } else if (built.header.from === 'guessed') {
    const commented = namesInComment(clean.lastComment, width);
    if (commented) {
      names = commented;
      built.header = { value: false, from: 'guessed', why: 'the names stand in the comment above the data' };
    }
  }
  if (table.rows.length === 0) {
    problems.whole('There is a header and no row under it.', 'Add the counts.', firstLine);
    return built;
  }
  if (built.header.value && built.header.from === 'guessed' && decideHeader(table.rows[0]).value) {
    problems.whole(
      'This line holds words only, like the one above it, which was taken for the names of the columns.',
      'Put # in front of titles and units; give numbers under the names.',
      table.lines[0]
    );
    return built;
  }
  const kept = reportRagged(table, width, separator.value, clean.text, problems);
  built.sheet = { ...kept, names, width, turned: false };
  return built;
}
