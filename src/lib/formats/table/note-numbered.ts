import { readWholeNumber } from '../number/read-whole-number';
import type { Table } from './read-table';

const open = { decimal: null, thousands: null };

/**
 * A remark for two columns without names that look like shot numbers and counts rather than counts
 * and numbers of shots: the first counts up by ones over 20 rows or more, and no number in the
 * second is as large as the number of rows. They are read as the rule says, count first; the
 * remark says how to change it.
 */
export function noteNumbered({ sheet, format }: Table): string[] {
  const { rows, names, width } = sheet;
  if (width !== 2 || names.some((name) => name !== null) || format.from === 'given' || rows.length < 20)
    return [];
  const value = (cell: string) => {
    const read = readWholeNumber(cell, open);
    return read.ok ? read.value : NaN;
  };
  const first = value(rows[0][0]);
  const numbered = rows.every(
    ([cell, other], row) => value(cell) === first + row && value(other) < rows.length
  );
  return numbered && first <= 1
    ? ['The first column is read as the count. If it numbers the shots, choose "shots" (a shot list).']
    : [];
}
