import { formatCount } from '$lib/model/format-number';
import type { Table } from '$lib/charts/table';

/** Rows of a table in print: a page of them. */
const MOST = 40;

/** A table for print, and what was left out of it in words; '' when nothing was. */
export interface PrintTable {
  table: Table;
  note: string;
}

/**
 * Cuts a long table to what a page holds. Rows that are not worth telling (never seen, and hardly expected) go first;
 * of the rest every third, fifth … one stays, the last one too, and the note says so.
 */
export function thinTable(table: Table, worth: (row: number) => boolean): PrintTable {
  const all = table.rows.length;
  if (all <= MOST) return { table, note: '' };
  const told = table.rows.map((_, i) => i).filter(worth);
  const [from, to] = [told[0] ?? 0, told.at(-1) ?? 0];
  const span = table.rows.slice(from, to + 1);
  // An odd step, since every second row would hide that counts prefer to be even.
  const least = Math.ceil(span.length / MOST);
  const step = least % 2 === 0 ? least + 1 : least;
  const rows = span.filter((_, i) => i % step === 0 || i === span.length - 1);
  const whole = `The document and the CSV files have all ${formatCount(all)}.`;
  if (step > 1) return { table: { ...table, rows }, note: `Every ${ordinal(step)} row. ${whole}` };
  return { table: { ...table, rows }, note: `Rows neither seen nor expected are left out. ${whole}` };
}

function ordinal(n: number): string {
  const tail = n % 100 > 10 && n % 100 < 14 ? 'th' : (['th', 'st', 'nd', 'rd'][n % 10] ?? 'th');
  return n === 3 ? 'third' : `${formatCount(n)}${tail}`;
}
