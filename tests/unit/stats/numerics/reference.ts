import { readFileSync } from 'node:fs';

type Cell = (string | number)[];

const file = JSON.parse(
  readFileSync(new URL('../../../../fixtures/reference/special.json', import.meta.url), 'utf8')
) as Record<string, Cell[]>;

/** Rows of one table of fixtures/reference/special.json (mpmath, 40 digits; see special.py beside it). */
export function reference(table: string): { side: 'high' | 'low'; row: number[] }[] {
  return file[table].map((cell) => ({
    side: cell[0] === 'low' ? 'low' : 'high',
    row: cell.map(Number)
  }));
}

/** |got/want − 1|, with 0 for equal values and for two zeros or infinities of one sign. */
export function relativeError(got: number, want: number): number {
  if (got === want) return 0;
  return Math.abs(got - want) / Math.abs(want);
}

/**
 * Error of a tail given by its logarithm: of the probability itself down to 1e-300, of the logarithm below
 * that (scaled to meet there), and of one minus the probability when that is the smaller number.
 */
export function tailError(got: number, want: number): number {
  if (got === want) return 0;
  if (want > -0.5) return Math.abs(got / want - 1);
  return Math.abs(got - want) / Math.max(1, -want / 690);
}
