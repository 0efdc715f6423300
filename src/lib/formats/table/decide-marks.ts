import type { NumberStyle, WholeNumber } from '../number/read-whole-number';
import type { Guess, ReadOptions, Reading, ThousandsMark } from '../types';
import type { Sheet } from './sheet';

const severalGroups = /^\s*[+\-−]?\d{1,3}([.,])\d{3}(\1\d{3})+(?!\d)/;
const bothMarks = /^\s*[+\-−]?\d{1,3}([.,])\d{3}(?:\1\d{3})*(?!\1)[.,]\d/;

/**
 * Decides which marks group thousands and start decimals. Only the person, or a number that can be
 * read one way only (`1,149,265`), settles it; with nothing settled, `1,149` is refused later.
 */
export function decideMarks(sheet: Sheet, columns: number[], options: ReadOptions): NumberStyle {
  const style: NumberStyle = { decimal: options.decimal ?? null, thousands: options.thousands ?? null };
  if (style.thousands !== null || style.decimal !== null) return style;
  const seen = new Set<ThousandsMark>();
  for (const row of sheet.rows) {
    for (const column of columns) {
      const cell = row[column];
      // Shorter cells cannot hold two marks and their digits.
      if (cell.length < 7) continue;
      const mark = (severalGroups.exec(cell) ?? bothMarks.exec(cell))?.[1];
      if (mark) seen.add(mark as ThousandsMark);
    }
  }
  if (seen.size === 1) [style.thousands] = seen;
  return style;
}

/** Counts how numbers were written, so that the reading can say it. */
export class MarkTally {
  zeroDecimals = 0;
  private decimal: '.' | ',' | null = null;
  private readonly groups = new Set<string>();

  note(read: WholeNumber & { ok: true }): void {
    if (read.written === 'zero-decimal') {
      this.zeroDecimals += 1;
      this.decimal = read.mark as '.' | ',';
    } else if (read.mark !== '') this.groups.add(read.mark);
  }

  /** The two mark entries of the reading. */
  report(options: ReadOptions): Pick<Reading, 'decimal' | 'thousands'> {
    const [group] = this.groups;
    const thousands: Reading['thousands'] = options.thousands
      ? { value: options.thousands, from: 'given', why: 'as you said' }
      : {
          value: named(group),
          from: 'guessed',
          why: group ? 'some numbers are grouped by it' : 'no number is grouped'
        };
    const decimal: Guess<'.' | ',' | 'none'> = options.decimal
      ? { value: options.decimal, from: 'given', why: 'as you said' }
      : {
          value: this.decimal ?? 'none',
          from: 'guessed',
          why: this.decimal ? 'some numbers have decimals, all zero' : 'no number has decimals'
        };
    return { decimal, thousands };
  }

  /** A sentence for the person when decimals of zero were dropped. */
  notes(): string[] {
    if (this.zeroDecimals === 0) return [];
    const example = `12${this.decimal}0`;
    return [
      this.zeroDecimals === 1
        ? `One number was written with decimals of zero, like ${example}, and read as a whole number.`
        : `${this.zeroDecimals} numbers were written with decimals of zero, like ${example}, and read as whole numbers.`
    ];
  }
}

function named(mark: string | undefined): ThousandsMark | 'space' | 'apostrophe' {
  if (mark === ' ') return 'space';
  if (mark === "'") return 'apostrophe';
  return mark === '.' || mark === ',' ? mark : 'none';
}
