import { ProblemList } from '../problem-list';
import type { Problem } from '../types';
import { maxPackedBytes, maxSites } from './limits';
import { readHeader, type SitesHeader } from './read-header';
import { splitLine, type Cell } from './split-line';

/** Shots with their sites; site i of a shot is bit i mod 8, lowest first, of byte ⌊i/8⌋ of its row. */
export interface SiteShots {
  sites: string[];
  shots: Uint8Array[];
}

export type SitesReading = ({ ok: true } & SiteShots) | { ok: false; problems: Problem[]; more: number };

const fixCell = 'Write 1 for a site that was excited in this shot and 0 for one that was not.';

/**
 * Reads site-resolved shots: one row a shot, and in it one cell of 0 or 1 a site, or one string of bits (spaces in
 * it change nothing). A header is optional; blank lines and lines that open with # are passed over. Never guessed:
 * a file of one 0 or 1 a line is a list of counts, so the caller has to ask for sites.
 *
 * @param text of the file, line ends of any kind
 * @returns names and packed shots, or every problem with its line and column from 1
 */
export function readSites(text: string): SitesReading {
  const problems = new ProblemList();
  const shots: Uint8Array[] = [];
  let header: SitesHeader | null = null;
  let width = 0;
  let first = true;
  let bytes = 0;
  const lines = text.replace(/^\ufeff/, '').split(/\r\n?|\n/);
  for (const [index, line] of lines.entries()) {
    if (line.trim() === '' || line.trimStart().startsWith('#')) continue;
    const cells = splitLine(line);
    if (first) header = readHeader(cells);
    const isHeader = first && header !== null;
    first = false;
    if (isHeader) continue;
    const bits = bitsOf(cells.slice(header?.leading ?? 0));
    if (width === 0) width = bits.length;
    if (bits.length !== width || width > maxSites) {
      if (width > maxSites) {
        problems.whole(`There are ${width} sites; the limit is ${maxSites}.`, 'Give fewer sites.', index + 1);
        break;
      }
      const message = `This row has ${bits.length} sites; the rows above have ${width}.`;
      problems.whole(message, 'Give every shot the same number of sites.', index + 1);
      continue;
    }
    const row = new Uint8Array(Math.ceil(width / 8));
    for (const [site, { text: bit, column }] of bits.entries()) {
      if (bit === '1') row[site >> 3] |= 1 << (site & 7);
      else if (bit !== '0') {
        const shown = bit === '' ? 'nothing' : `“${bit.slice(0, 20)}”`;
        const message = `Site ${site + 1} of this shot is ${shown}, neither 0 nor 1.`;
        problems.add(() => ({ line: index + 1, column, message, fix: fixCell }));
      }
    }
    bytes += row.length;
    if (bytes > maxPackedBytes) {
      const message = 'The shots take more than 64 MB when packed, which is the limit.';
      problems.whole(message, 'Give fewer shots.', index + 1);
      break;
    }
    shots.push(row);
  }
  if (!problems.any) refuseWhole(problems, shots.length, width, header);
  if (problems.any) return { ok: false, problems: problems.kept, more: problems.more };
  const named = header !== null && header.names.length === width;
  return { ok: true, sites: named ? header!.names : numbered(width), shots };
}

/** One cell a bit: cells of several characters, all 0 or 1, are strings of bits and taken apart. */
function bitsOf(cells: Cell[]): Cell[] {
  return cells.flatMap((cell) =>
    /^[01]{2,}$/.test(cell.text) || (cells.length === 1 && cell.text.length > 1)
      ? Array.from(cell.text, (text, offset) => ({ text, column: cell.column + offset }))
      : [cell]
  );
}

function refuseWhole(problems: ProblemList, shots: number, width: number, header: SitesHeader | null): void {
  if (shots === 0) problems.whole('There are no shots.', 'Give one row a shot, with a 0 or 1 for each site.');
  else if (width < 2)
    problems.whole(
      width === 0 ? 'There are no sites.' : 'There is one site only.',
      'Give two sites or more, or a list of counts.'
    );
  else if (header && header.names.length > 1) {
    const { names } = header;
    if (names.length !== width) {
      const message = `The header names ${names.length} sites; the shots have ${width}.`;
      problems.whole(message, 'Give one name a site, or leave the header out.');
    } else if (new Set(names).size !== width || names.includes('')) {
      problems.whole('A name in the header is empty or there twice.', 'Give each site a name of its own.');
    }
  }
}

function numbered(width: number): string[] {
  return Array.from({ length: width }, (_, site) => String(site + 1));
}
