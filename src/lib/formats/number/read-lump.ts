import { labelNumber, lumpLabel } from './lump-label';
import type { NumberStyle } from './read-whole-number';

/** "10 or more" in the words of several languages; accents are already gone. */
const after =
  /^(.+?)\s*(\+|(?:or|and|&) (?:more|over|above|up|greater|higher)|and upwards?|(?:und|oder) mehr|(?:et|ou) plus|[yo] mas|[eo] piu|(?:e|ou) mais|(?:of|en) meer|eller (?:fler|flere|mer)|(?:lub|i) wiecej|и более|以上|이상)$/;
const from =
  /^(?:>=|=>|≥|⩾|≧|at least|min\.?|minimum|mindestens|ab|au moins|al menos|almeno|pelo menos)\s*(.+)$/;
const above = /^(?:>|more than|over|mehr als|plus de|mas de|piu di|mais de|meer dan)\s*(.+)$/;

/**
 * Reads the label of a closing row that lumps all larger counts: `10+`, `≥10`, `>=10`,
 * `10 or more`, `more than 9`, and the like in a few languages.
 *
 * @returns the smallest count in the lump, or null when the cell is no such label.
 */
export function readLump(cell: string, style: NumberStyle): number | null {
  const label = lumpLabel(cell);
  if (label === null) return null;
  const suffixed = after.exec(label);
  if (suffixed) return labelNumber(suffixed[1], style);
  const least = from.exec(label);
  if (least) return labelNumber(least[1], style);
  const beyond = above.exec(label);
  const value = beyond ? labelNumber(beyond[1], style) : null;
  return value === null ? null : value + 1;
}
