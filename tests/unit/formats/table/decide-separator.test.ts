import { describe, expect, it } from 'vitest';
import { decideSeparator } from '$lib/formats/table/decide-separator';

const chosen = (...lines: string[]) => decideSeparator(lines).value;

describe('decideSeparator', () => {
  it.each([
    [['count,shots', '0,12'], 'comma'],
    [['count, shots', '0, 12'], 'comma'],
    [['count;shots', '0;12'], 'semicolon'],
    [['0;1 149', '1;3 265'], 'semicolon'],
    [['3,0;12,0', '4,0;5,0'], 'semicolon'],
    [['count\tshots', '0\t12'], 'tab'],
    [['a b\t3', 'c d\t4'], 'tab'],
    [['0 12', '1   30', '  2 9'], 'spaces'],
    [['0 12', '10 or more 3'], 'spaces'],
    [['3', '4', '5'], 'none'],
    [['1 000', '990', '1 010', '985'], 'none'],
    [['"a,b",3', '"c,d",4'], 'comma'],
    [[], 'none']
  ])('of %j is %s', (lines, expected) => {
    expect(chosen(...lines)).toBe(expected);
  });

  it('keeps what most lines agree on when a few are ragged, and says how many', () => {
    const guess = decideSeparator(['0,12', '1,30', '2,9', '3']);
    expect(guess).toMatchObject({ value: 'comma', from: 'guessed' });
    expect(guess.why).toContain('75 %');
  });

  it('follows the first line of a spreadsheet, and the person before all', () => {
    expect(decideSeparator(['sep=;', 'a,b;c'])).toMatchObject({ value: 'semicolon', from: 'stated' });
    expect(decideSeparator(['0,12'], 'none')).toMatchObject({ value: 'none', from: 'given' });
  });
});
