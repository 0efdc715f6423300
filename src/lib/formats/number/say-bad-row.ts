import { lumpLabel } from './lump-label';
import { readLump } from './read-lump';
import { readOpening } from './read-opening';
import type { NumberStyle } from './read-whole-number';

const plain: NumberStyle = { decimal: null, thousands: null };
const signed = /^(?:<=|=<|≤|⩽|≦|<|>=|=>|≥|⩾|≧|>)\s*(.+)$/;
const fromZero = /^0\s*(?:-|–|—|to\s|bis\s|\.\.|…)\s*(.+)$/;
const range = /^(\d+)\s*(?:-|–|—|to|bis|a|\.\.|…)\s*(\d+)$/;

const lumps = 'only an opening row such as 0-2 and a closing one such as 10+ may cover several counts.';

/**
 * What is wrong with a cell that names several counts where it may not, or that lumps counts up to something else than a
 * whole number; null for other cells.
 *
 * @param cited the cell as messages quote it
 * @param what as in `sayBadNumber`: rows of "counts" may lump, single shots and numbers of shots may not
 */
export function sayBadRow(
  cell: string,
  cited: string,
  what: string
): { message: string; fix: string } | null {
  const label = lumpLabel(cell);
  if (label === null) return null;
  const ends = range.exec(label);
  if (what !== 'counts') {
    if (!ends && readLump(cell, plain) === null && readOpening(cell, plain) === null) return null;
    return {
      message: `${cited} stands for several numbers.`,
      fix: `Give ${what} one by one; in a table of counts and numbers of shots, ${lumps}`
    };
  }
  if (ends) {
    const backwards = BigInt(ends[1]) > BigInt(ends[2]);
    return {
      message: backwards
        ? `${cited} is a range that runs backwards.`
        : `${cited} is a range that does not begin at 0.`,
      fix: `Give each count its own row; ${lumps}`
    };
  }
  if (/^(?:<|less than|fewer than|under)\s*0+$/.test(label)) {
    return {
      message: `${cited} holds no count: there is none below 0.`,
      fix: 'Take the row out; write 0 for empty shots.'
    };
  }
  const end = signed.exec(label) ?? fromZero.exec(label);
  if (!end) return null;
  return {
    message: `${cited} would lump counts, but “${end[1].slice(0, 20)}” is not a whole number.`,
    fix: 'Write an opening row such as 0-2 or ≤2, a closing one such as 10+.'
  };
}
