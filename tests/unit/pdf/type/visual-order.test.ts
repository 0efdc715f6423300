import { readsFromRight, visualOrder } from '$lib/pdf/type/visual-order';
import { describe, expect, it } from 'vitest';

/** Pieces as they stand on paper: those of Hebrew are turned by the font's layout, here by hand. */
const onPaper = (line: string, fromRight = readsFromRight(line)): string =>
  visualOrder(line, fromRight)
    .map((piece) => (/\p{sc=Hebrew}/u.test(piece) ? [...piece].reverse().join('') : piece))
    .join('');

describe('visualOrder', () => {
  it('leaves a line of latin, Greek or Chinese alone', () => {
    expect(visualOrder('N = 60 (κ₂), 漢字', false)).toEqual(['N = 60 (κ₂), 漢字']);
  });

  // Worked by hand with the rules of Unicode Standard Annex 9.
  it.each([
    ['words of Hebrew in a latin line', 'run אב גד end', 'run דג בא end'],
    ['a number between Hebrew words', 'run אב 123 גד end', 'run דג 123 בא end'],
    ['a Hebrew line with a stop', 'אב גד.', '.דג בא'],
    ['latin in a Hebrew line', 'אב N = 60 גד', 'דג N = 60 בא'],
    ['brackets, mirrored', 'אב (גד) ה', 'ה (דג) בא'],
    ['brackets around a number', 'run אב (12) end', 'run (12) בא end'],
    ['brackets around latin', 'אב (N) ה', 'ה (N) בא'],
    ['a decimal number', 'אב 3.25 גד', 'דג 3.25 בא']
  ])('sets %s', (_what, line, paper) => {
    expect(onPaper(line)).toBe(paper);
  });

  it('loses no sign', () => {
    const line = 'a אב, (12) b "גד" 3.4 ה!';
    for (const side of [true, false])
      expect([...visualOrder(line, side).join('')].sort().join('')).toBe([...line].sort().join(''));
  });
});
