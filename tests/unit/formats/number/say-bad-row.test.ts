import { readCounts } from '$lib/formats/read-counts';
import { describe, expect, it } from 'vitest';

/** What is said of the first fault of a text, with its place. */
function said(text: string, options: Parameters<typeof readCounts>[1] = {}): string {
  const read = readCounts(text, options);
  if (read.ok) throw new Error(`${JSON.stringify(text)} is read`);
  const { line, column, message, fix } = read.problems[0];
  return `${line}:${column} ${message} ${fix}`;
}

describe('a row that cannot lump counts', () => {
  it.each([
    [
      '3,4\n2-4,5\n',
      '2:1 "2-4" is a range that does not begin at 0. Give each count its own row; only an opening'
    ],
    [
      '5-3,4\n6,5\n',
      '1:1 "5-3" is a range that runs backwards. Give each count its own row; only an opening'
    ],
    ['3 to 5,4\n6,5\n', '1:1 "3 to 5" is a range that does not begin at 0.'],
    ['1-0,4\n6,5\n', '1:1 "1-0" is a range that runs backwards.'],
    [
      '<0,4\n1,5\n',
      '1:1 "<0" holds no count: there is none below 0. Take the row out; write 0 for empty shots.'
    ],
    ['fewer than 0,4\n1,5\n', '1:1 "fewer than 0" holds no count'],
    [
      '0-2.5,4\n3,5\n',
      '1:1 "0-2.5" would lump counts, but “2.5” is not a whole number. Write an opening row such as'
    ],
    ['≤-2,4\n3,5\n', '1:1 "≤-2" would lump counts, but “-2” is not a whole number.'],
    ['0--2,4\n3,5\n', '1:1 "0--2" would lump counts, but “-2” is not a whole number.'],
    ['0 to many,4\n3,5\n', '1:1 "0 to many" would lump counts, but “many” is not a whole number.'],
    ['3,4\n>=x,5\n', '2:1 ">=x" would lump counts, but “x” is not a whole number.'],
    ['3,4\n4,0-2\n', '2:3 "0-2" stands for several numbers. Give numbers of shots one by one;'],
    ['3,4\n4,10+\n', '2:3 "10+" stands for several numbers. Give numbers of shots one by one;'],
    ['3,4\nabout four,5\n', '2:1 "about four" is not a number. Give counts as whole numbers in digits 0–9.'],
    ['{"counts": {"3": 4, "2-5": 5}}', '1:21 "2-5" is a range that does not begin at 0.'],
    ['[["<0", 4], [1, 5]]', '1:3 "<0" holds no count']
  ])('%j is refused in words', (text, words) => {
    expect(said(text)).toContain(words);
  });

  it.each(['0-2\n3\n4\n', '3\n0-2\n4\n', '{"shots": ["0-2", 3, 4]}'])(
    'the shot list %j has none: a shot has one count',
    (text) => {
      expect(said(text)).toContain(
        '"0-2" stands for several numbers. Give counts of single shots one by one;'
      );
    }
  );
});
