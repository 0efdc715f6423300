import { type NumberStyle, readWholeNumber } from './read-whole-number';

/** A cell as the patterns of lumps expect it: without accents, in small letters, single spaces; null where no pattern can match. */
export function lumpLabel(cell: string): string | null {
  // Two letters of "or" or a sign must be there; plain numbers leave at once.
  if (cell.length > 60 || /^[\d\s]*$/.test(cell)) return null;
  return cell
    .normalize('NFD')
    .replace(/\p{Mn}/gu, '')
    .normalize('NFC')
    .toLowerCase()
    .replace(/\s+/g, ' ')
    .trim();
}

/** The whole number of a label, without a sign of its own. */
export function labelNumber(text: string, style: NumberStyle): number | null {
  const read = readWholeNumber(text.trim(), style);
  return read.ok && !/^[+-]/.test(text.trim()) ? read.value : null;
}
