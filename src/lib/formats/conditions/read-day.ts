/**
 * A day as YYYY-MM-DD from the ways it is written in files: 2026-03-14, 2026/3/14, 20260314, 14.3.2026, also with a
 * time behind. 3/14/2026 and 14/3/2026 only where one reading is possible.
 *
 * @returns null when it is not one day for certain
 */
export function readDay(cell: string): string | null {
  const bare = cell.trim().replace(/(?<=\d)[T ]\d\d?:\d\d.*$/, '');
  const yearFirst = /^(\d{4})([-/.]?)(\d\d?)\2(\d\d?)$/.exec(bare);
  if (yearFirst) return day(+yearFirst[1], +yearFirst[3], +yearFirst[4]);
  const dots = /^(\d\d?)\.(\d\d?)\.(\d{4})$/.exec(bare);
  if (dots) return day(+dots[3], +dots[2], +dots[1]);
  const slashes = /^(\d\d?)\/(\d\d?)\/(\d{4})$/.exec(bare);
  if (!slashes) return null;
  const [first, second, year] = [+slashes[1], +slashes[2], +slashes[3]];
  if (first > 12) return day(year, second, first);
  return second > 12 || first === second ? day(year, first, second) : null;
}

function day(year: number, month: number, date: number): string | null {
  const at = new Date(Date.UTC(year, month - 1, date));
  const exists = at.getUTCFullYear() === year && at.getUTCMonth() === month - 1 && at.getUTCDate() === date;
  return exists ? at.toISOString().slice(0, 10) : null;
}
