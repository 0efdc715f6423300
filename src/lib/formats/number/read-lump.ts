import { type NumberStyle, readWholeNumber } from './read-whole-number';

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
  // Two letters of "or" or a sign must be there; plain numbers leave at once.
  if (cell.length > 60 || /^[\d\s]*$/.test(cell)) return null;
  const label = cell
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .normalize('NFC')
    .toLowerCase()
    .replace(/\s+/g, ' ')
    .trim();
  const number = (text: string): number | null => {
    const read = readWholeNumber(text.trim(), style);
    return read.ok && !/^[+-]/.test(text.trim()) ? read.value : null;
  };
  const suffixed = after.exec(label);
  if (suffixed) return number(suffixed[1]);
  const least = from.exec(label);
  if (least) return number(least[1]);
  const beyond = above.exec(label);
  const value = beyond ? number(beyond[1]) : null;
  return value === null ? null : value + 1;
}
