import { formatCount, formatNumber, formatPercent } from '$lib/stats/words/format-number';
import { sayHowOften, sayP } from '$lib/stats/words/say-p';
import { describe, expect, it } from 'vitest';

describe('formatNumber', () => {
  it.each<[number | null, number, string]>([
    [0.3376986, 4, '0.3377'],
    [-12345.678, 7, '\u221212\u202f345.68'],
    [1999, 4, '1\u202f999'],
    [0.0000234, 3, '2.34 × 10⁻⁵'],
    [6.02e23, 3, '6.02 × 10²³'],
    [0, 4, '0'],
    [null, 4, '–'],
    [NaN, 4, '–']
  ])('%s with %i digits is %s', (value, digits, text) => {
    expect(formatNumber(value, digits)).toBe(text);
  });

  it('groups whole numbers and writes shares as per cent', () => {
    expect(formatCount(26306)).toBe('26\u202f306');
    expect(formatPercent(0.0234)).toBe('2.3\u202f%');
  });
});

describe('sayP', () => {
  it('puts the plain words first and the number second', () => {
    expect(sayP(0.0003, 0.0001, 9999)).toBe(
      'would turn up once in 3\u202f300 repeats of the experiment (p = 0.00030, 9\u202f999 resamples)'
    );
  });

  it('says at most where the p-value is the smallest that could be shown', () => {
    expect(sayP(0.0005, 0.0005, 1999)).toMatch(/at most once in 2\u202f000 .*p ≤ 0\.00050/);
  });

  it('counts in a hundred when common', () => {
    expect(sayHowOften(0.36)).toBe('would turn up in 36 of 100 repeats of the experiment');
    expect(sayHowOften(1)).toMatch(/practically every/);
  });
});
