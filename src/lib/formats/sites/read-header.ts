import type { Cell } from './split-line';

/** What the first line says of the columns: how many leading ones are no sites, and the names of the others. */
export interface SitesHeader {
  leading: number;
  names: string[];
}

const leadingWords = new Set(['shot', 'shots', 'batch', 'run', 'index', 'id']);

/**
 * Reads a header, or gives null when the line holds a shot. Columns called shot, batch, run, index or id may stand
 * before the sites, and say that the line is a header; otherwise every cell must begin with a letter, so that a
 * first shot with one bad cell is refused rather than passed over. Without a header there are no leading columns.
 */
export function readHeader(cells: Cell[]): SitesHeader | null {
  let leading = 0;
  while (leading < cells.length && leadingWords.has(cells[leading].text.toLowerCase())) leading += 1;
  const names = cells.slice(leading).map(({ text }) => text);
  return leading > 0 || names.every((name) => /^\p{L}/u.test(name)) ? { leading, names } : null;
}
