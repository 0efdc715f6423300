import { formatCount, formatNumber, formatPercent } from '$lib/stats/words/format-number';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const thin = '\u202f';

/** The number a person would read. */
function read(text: string): number {
  const digits = '⁰¹²³⁴⁵⁶⁷⁸⁹';
  const [mantissa, power] = text.replaceAll(thin, '').replace('−', '-').split(' × 10');
  const exponent = (power ?? '').replace('⁻', '-').replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]/g, (c) => String(digits.indexOf(c)));
  return Number(mantissa) * 10 ** Number(exponent || 0);
}

describe('formatNumber', () => {
  it.each([
    [0, 4, '0'],
    [-0, 4, '0'],
    [4.052383, 4, '4.052'],
    [0.3376986, 7, '0.3376986'],
    [-1.5, 2, '−1.5'],
    [26306, 4, `26${thin}306`],
    [1234567.8, 4, `1${thin}234${thin}568`],
    [0.0001, 2, '0.00010'],
    [0.00002512, 3, '2.51 × 10⁻⁵'],
    [-2.5e-17, 2, '−2.5 × 10⁻¹⁷'],
    [3.2e11, 2, '3.2 × 10¹¹'],
    [100, 2, '100'],
    [1000, 4, `1${thin}000`],
    [NaN, 4, '–'],
    [Infinity, 4, '–'],
    [null, 4, '–']
  ])('writes %s with %s digits as %s', (value, digits, want) => {
    expect(formatNumber(value, digits)).toBe(want);
  });

  it('can be read back to its digits', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e15, max: 1e15, noNaN: true }),
        fc.double({ min: -30, max: 15, noNaN: true }),
        fc.integer({ min: 2, max: 9 }),
        (sign, exponent, digits) => {
          const value = Math.sign(sign || 1) * 10 ** exponent;
          const error = Math.abs(read(formatNumber(value, digits)) - value);
          expect(error).toBeLessThanOrEqual(0.5000001 * 10 ** (1 - digits) * Math.abs(value));
        }
      )
    );
  });
});

describe('formatCount and formatPercent', () => {
  it('group thousands and put a thin space before the sign', () => {
    expect(formatCount(1999)).toBe(`1${thin}999`);
    expect(formatCount(2 ** 40)).toBe(`1${thin}099${thin}511${thin}627${thin}776`);
    expect(formatCount(-3.4)).toBe('−3');
    expect(formatCount(null)).toBe('–');
    expect(formatPercent(0.1)).toBe(`10${thin}%`);
    expect(formatPercent(0.2391, 3)).toBe(`23.9${thin}%`);
    expect(formatPercent(NaN)).toBe('–');
  });
});
