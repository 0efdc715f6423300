import { labelNumber, lumpLabel } from './lump-label';
import type { NumberStyle } from './read-whole-number';

/** "2 or fewer" in the words of several languages; accents are already gone. */
const after =
  /^(.+?)\s*(?:(?:or|and|&) (?:fewer|less|under|below|lower)|(?:und|oder) weniger|(?:et|ou) moins|[yo] menos|[eo] meno|(?:e|ou) menos|(?:of|en) minder|eller (?:farre|faerre|mindre)|(?:lub|i) mniej|и менее|以下|이하)$/;
const upTo =
  /^(?:<=|=<|≤|⩽|≦|at most|up to|max\.?|maximum|hochstens|bis|au plus|jusqu'a|como maximo|hasta|al massimo|no maximo|ate|hoogstens)\s*(.+)$/;
const under = /^(?:<|less than|fewer than|under|weniger als|moins de|menos de|meno di|minder dan)\s*(.+)$/;
/** A range counts only from 0: nothing else lumps all smaller counts. */
const range = /^0\s*(?:-|–|—|to|bis|a|\.\.|…)\s*(.+)$/;

/**
 * Reads the label of an opening row that lumps all smaller counts: `≤2`, `<=2`, `0-2`, `2 or fewer`, `fewer than 3`, and
 * the like in a few languages.
 *
 * @returns the largest count in the lump, or null when the cell is no such label; "fewer than 0" is none.
 */
export function readOpening(cell: string, style: NumberStyle): number | null {
  const label = lumpLabel(cell);
  if (label === null) return null;
  const found = after.exec(label) ?? upTo.exec(label) ?? range.exec(label);
  if (found) return labelNumber(found[1], style);
  const beyond = under.exec(label);
  const value = beyond ? labelNumber(beyond[1], style) : null;
  return value === null || value === 0 ? null : value - 1;
}
