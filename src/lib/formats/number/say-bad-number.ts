import type { BadNumber } from './read-whole-number';
import { sayBadRow } from './say-bad-row';

const months = 'jan|feb|mar|mär|apr|may|mai|jun|jul|aug|sep|oct|okt|nov|dec|dez';
const date = new RegExp(`^(\\d{1,2}[-. ](${months})\\w*|(${months})\\w*[-. ]\\d{1,2})\\.?$`, 'i');

/** A cell as quoted in a message: short, and on one line. */
export function quote(cell: string): string {
  const line = cell.slice(0, 200).trim().replace(/\s+/g, ' ');
  return `"${line.length > 40 ? `${line.slice(0, 39)}…` : line}"`;
}

/**
 * Says what is wrong with a cell that should be a whole number, and what to do.
 *
 * @param what plural noun of what the cell should hold, such as "counts", "counts of single shots" or "numbers of shots".
 */
export function sayBadNumber(bad: BadNumber, cell: string, what: string): { message: string; fix: string } {
  const cited = quote(cell);
  switch (bad) {
    case 'missing':
      return cell.trim() === ''
        ? { message: 'The cell is empty.', fix: `Fill it, or take the row out; ${what} cannot be guessed.` }
        : {
            message: `${cited} is no number.`,
            fix: `Take the row out, or give the number; ${what} cannot be guessed.`
          };
    case 'infinite':
      return { message: `${cited} is infinite.`, fix: `Give ${what} as whole numbers.` };
    case 'negative':
      return {
        message: `${cited} is negative.`,
        fix: `There are no negative ${what}: correct or take out the row.`
      };
    case 'fraction':
      return {
        message: `${cited} is not a whole number.`,
        fix: `Give ${what}, not averages, shares or densities.`
      };
    case 'share':
      return { message: `${cited} is a percentage.`, fix: `Give ${what}, not shares.` };
    case 'ambiguous':
      return {
        message: `${cited} can be read two ways: with decimals, or with digits grouped by thousands.`,
        fix: 'Write it without the mark, or say what the mark means (thousands or decimal).'
      };
    case 'too-large':
      return {
        message: `${cited} is above 2^53 (9 007 199 254 740 992): whole numbers are no longer exact there.`,
        fix: 'Check the number.'
      };
    case 'not-a-number':
      return sayWords(cell, cited, what);
  }
}

function sayWords(cell: string, cited: string, what: string): { message: string; fix: string } {
  const text = cell.slice(0, 200).trim();
  if (date.test(text)) {
    return {
      message: `${cited} looks like a date that a spreadsheet made out of a range.`,
      fix: 'Give each count its own row; only an opening row such as ≤2 and a closing one such as 10+ may cover several counts.'
    };
  }
  const row = sayBadRow(text, cited, what);
  if (row) return row;
  if (/^[\d.,]+\s*#/.test(text)) {
    return {
      message: `${cited} has a comment behind the number.`,
      fix: 'Put comments on lines of their own.'
    };
  }
  return { message: `${cited} is not a number.`, fix: `Give ${what} as whole numbers in digits 0–9.` };
}
