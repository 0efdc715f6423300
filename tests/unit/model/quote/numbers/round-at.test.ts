import { plainNumber } from '$lib/model/quote/notation/to-plain';
import { asGiven } from '$lib/model/quote/numbers/as-given';
import { roundAt } from '$lib/model/quote/numbers/round-at';
import { roundToDigits } from '$lib/model/quote/numbers/round-to-digits';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('roundAt', () => {
  it('rounds from the exact binary value, as toFixed does', () => {
    // 1.005 is 1.00499999999999989… in binary; the second has no neighbour below the tie.
    expect(roundAt(1.005, -2).digits).toBe('1.00');
    expect(roundAt(0.125, -2).digits).toBe('0.13');
    fc.assert(
      fc.property(
        fc.double({ min: -1e12, max: 1e12, noNaN: true }),
        fc.integer({ min: 0, max: 15 }),
        (x, places) => {
          const { digits, negative } = roundAt(x, -places);
          expect(digits).toBe(Math.abs(x).toFixed(places));
          expect(negative).toBe(x < 0 && Number(digits) !== 0);
        }
      ),
      { numRuns: 3000 }
    );
  });

  it('rounds to tens and hundreds, and past the leading digit', () => {
    expect([96, 95, 94.9, 5, 4.999].map((x) => roundAt(x, 1).digits)).toEqual([
      '100',
      '100',
      '90',
      '10',
      '0'
    ]);
    expect(roundAt(996, 1, 2)).toMatchObject({ digits: '10.0', power: 2 });
    expect(roundAt(0, -3).digits).toBe('0.000');
  });
});

describe('roundToDigits', () => {
  it.each([
    [0.0005, 2, '0.00050'],
    [0.09996, 2, '0.10'],
    [0.9996, 3, '1.00'],
    [1.0000000009e-6, 2, '1.0 × 10⁻⁶'],
    [9.96e-5, 2, '1.0 × 10⁻⁴'],
    [12345, 2, '12\u202f000'],
    [0, 2, '0']
  ])('%d at %d digits is %s', (value, digits, expected) =>
    expect(plainNumber(roundToDigits(value, digits))).toBe(expected)
  );

  it('agrees with toPrecision when read back', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-300, max: 1e300, noNaN: true }),
        fc.integer({ min: 1, max: 12 }),
        (x, digits) => {
          const { digits: written, power } = roundToDigits(x, digits);
          expect(Number(`${written}e${power ?? 0}`)).toBe(Number(x.toPrecision(digits)));
        }
      ),
      { numRuns: 3000 }
    );
  });
});

describe('asGiven', () => {
  it.each([
    [0.01, '0.01'],
    [0.1, '0.1'],
    [1999, '1\u202f999'],
    [4294967295, '4\u202f294\u202f967\u202f295'],
    [5e-7, '5 × 10⁻⁷'],
    [1, '1'],
    [0, '0'],
    [120, '120']
  ])('%d is %s', (value, expected) => expect(plainNumber(asGiven(value))).toBe(expected));

  it('is exactly what was given', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-12, max: 1e15, noNaN: true }), (x) => {
        const { digits, power } = asGiven(x);
        expect(Number(`${digits}e${power ?? 0}`)).toBe(x);
      }),
      { numRuns: 2000 }
    );
  });
});
