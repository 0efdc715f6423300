import { maxColumns } from '../limits';
import type { ProblemList } from '../problem-list';
import type { FormatId, Guess, Separator } from '../types';
import { isNumberLike } from './role-draft';
import type { ParsedTable } from './parse-table';

/**
 * Tables that could be read in a way that changes their numbers, or that run across the page.
 * Adds a problem and returns false where the file must not be read as it stands.
 */
export function checkShape(
  table: ParsedTable,
  width: number,
  separator: Guess<Separator>,
  format: FormatId | 'auto',
  problems: ProblemList
): boolean {
  const { rows, lines } = table;
  const numbers = (row: string[]) => row.every(isNumberLike);
  if (rows.length === 1 && width > 2 && numbers(rows[0]) && (format === 'auto' || format === 'counts')) {
    problems.whole(
      `One line of ${width} numbers can be read two ways: as one count a shot, or as numbers of shots with 0, 1, 2 … defects.`,
      'Say which: a shot list (shots), or numbers of shots by position (positions).',
      lines[0]
    );
    return false;
  }
  if (width > maxColumns && rows.length > 1) {
    problems.whole(
      `There are ${width} columns; the limit is ${maxColumns}.`,
      'Give a row for each count.',
      lines[0]
    );
    return false;
  }
  if (rows.length === 2 && width > 3 && rows.every((row) => numbers(row.slice(1)))) {
    problems.whole(
      'The table runs across: its two rows hold the counts and the numbers of shots.',
      'Turn it (transpose), so that each count has its own row.',
      lines[0]
    );
    return false;
  }
  const grouping = separator.value === 'comma' || separator.value === 'spaces';
  if (grouping && separator.from === 'guessed' && width === 2 && looksGrouped(rows)) {
    const mark = separator.value === 'comma' ? 'commas' : 'spaces';
    problems.whole(
      `The ${mark} can be read two ways: "${rows[0].join(separator.value === 'comma' ? ',' : ' ')}" may be two columns or one number grouped by thousands.`,
      `Write the numbers without grouping, or say that ${mark} separate the columns.`,
      lines[0]
    );
    return false;
  }
  return true;
}

/** All second cells are three digits, and one starts with a zero: 1,049 rather than 1 and 49. */
function looksGrouped(rows: string[][]): boolean {
  const grouped = rows.every(
    ([first, second]) => /^[1-9]\d{0,2}$/.test(first) && /^\d{3}$/.test(second ?? '')
  );
  return grouped && rows.some(([, second]) => second.startsWith('0'));
}
