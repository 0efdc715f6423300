import { plainNumber } from '$lib/model/quote/notation/to-plain';
import type { QuotedNumber } from '$lib/model/quote/numbers/quoted-number';
import { roundToUncertainty } from '$lib/model/quote/numbers/round-to-uncertainty';
import type { Interval } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const told = (value: number | null, low: number | null, high: number | null) => {
  const rounded = roundToUncertainty({ value, low, high });
  if (!rounded) return null;
  const say = (number: QuotedNumber | null) => (number ? plainNumber(number) : null);
  return [say(rounded.value), say(rounded.low), say(rounded.high)];
};

describe('rounding to the uncertainty', () => {
  // JCGM 100:2008, 7.2.2 quotes m = 100,021 47 g with U = 0,79 mg, and 7.2.6 rounds x = 10,057 62 Ω with u = 27 mΩ to
  // 10,058 Ω (cited from memory).
  it.each([
    [
      'the mass of 7.2.2',
      [100.02147, 100.02147 - 0.00079, 100.02147 + 0.00079],
      ['100.02147', '100.02068', '100.02226']
    ],
    [
      'the resistance of 7.2.6',
      [10.05762, 10.05762 - 0.027, 10.05762 + 0.027],
      ['10.058', '10.031', '10.085']
    ],
    ['trailing zeros kept', [1.2, 1.1, 1.3], ['1.20', '1.10', '1.30']],
    ['asymmetric limits, one decimal', [1.23456, 1.1, 1.9], ['1.23', '1.10', '1.90']],
    ['a half-width that rounds up to three digits', [2, 1.9004, 2.0996], ['2.00', '1.90', '2.10']],
    ['no upper limit', [0.51234, 0.41, null], ['0.51', '0.41', null]],
    ['no lower limit', [0.51234, null, 1.7], ['0.5', null, '1.7']],
    ['no limits', [3.871549, null, null], ['3.872', null, null]],
    ['no width', [2, 2, 2], ['2.000', '2.000', '2.000']],
    ['sides that have nothing in common', [24.5, 4.9, 24900], ['25', '5', '24\u202f900']],
    ['a short lower side', [2.64e-5, 0, 3.39e-4], ['0.000026', '0.000000', '0.000339']],
    ['nothing at all', [0, 0, 0], ['0', '0', '0']],
    ['a real minus', [-0.01234, -0.05, 0.02], ['\u22120.012', '\u22120.050', '0.020']],
    ['a value that rounds to 0 has no sign', [-0.001, -0.5, 0.5], ['0.00', '\u22120.50', '0.50']],
    ['thousands', [12345.678, 11111, 13333], ['12\u202f300', '11\u202f100', '13\u202f300']],
    ['small', [2.2e-5, 0, 4.1e-5], ['2.2 × 10⁻⁵', '0', '4.1 × 10⁻⁵']],
    [
      'small, with a limit one power on',
      [2.2e-5, 0.4e-5, 9.6e-5],
      ['2.2 × 10⁻⁵', '0.4 × 10⁻⁵', '9.6 × 10⁻⁵']
    ],
    ['small, and the value 0', [0, 0, 1.26e-5], ['0', '0', '1.3 × 10⁻⁵']],
    ['large', [2.5e12, 2.4e12, 2.6e12], ['2.50 × 10¹²', '2.40 × 10¹²', '2.60 × 10¹²']],
    [
      'digits that a double does not hold',
      [1 / 3, 1 / 3, 1 / 3 + 1e-16],
      ['0.333333333333333', '0.333333333333333', '0.333333333333333']
    ]
  ] as [string, [number, number | null, number | null], (string | null)[]][])(
    '%s',
    (_, [v, l, h], expected) => {
      expect(told(v, l, h)).toEqual(expected);
    }
  );

  it('gives nothing for no value', () => expect(told(null, null, null)).toBeNull());
});

/** What stands on the page, read back. */
/** The half-width that decides, written out a second time: the shorter of two very different sides. */
function deciding({ value, low, high }: Interval): number {
  const down = value! - low!;
  const up = high! - value!;
  if (down === 0 || up === 0) return high! - low!;
  if (down > 0 && up > 10 * down) return Math.max(down, up / 10_000);
  if (up > 0 && down > 10 * up) return Math.max(up, down / 10_000);
  return (high! - low!) / 2;
}

const back = (number: QuotedNumber): number => {
  const [mantissa, power] = plainNumber(number)
    .replaceAll('\u202f', '')
    .replace('\u2212', '-')
    .split(' × 10');
  const exponent = [...(power ?? '⁰')].map((c) => '0123456789-'['⁰¹²³⁴⁵⁶⁷⁸⁹⁻'.indexOf(c)]).join('');
  return Number(`${mantissa}e${exponent}`);
};
/** Size of the last digit that stands there. */
const step = ({ digits, power }: QuotedNumber): number =>
  Number(`1e${(power ?? 0) - (digits.split('.')[1]?.length ?? 0)}`);

const size = fc
  .tuple(fc.double({ min: 1, max: 9.999999999, noNaN: true }), fc.integer({ min: -30, max: 30 }))
  .map(([mantissa, exponent]) => mantissa * 10 ** exponent);
const signed = fc.tuple(size, fc.boolean()).map(([x, below]) => (below ? -x : x));
const intervals: fc.Arbitrary<Required<Interval>> = fc
  .tuple(
    signed,
    size,
    fc.double({ min: -12, max: 3, noNaN: true }),
    fc.double({ min: 0, max: 1, noNaN: true })
  )
  .map(([value, , relative, share]) => {
    const width = Math.abs(value) * 10 ** relative;
    return { value, low: value - share * width, high: value + (1 - share) * width };
  });

describe('for any interval', () => {
  it('every number lies within half a unit of what it was rounded from, and keeps its sign', () => {
    fc.assert(
      fc.property(intervals, (interval) => {
        const rounded = roundToUncertainty(interval)!;
        const half = deciding(interval);
        // The unit of two digits of the half-width, or of fifteen digits of the largest number.
        const largest = Math.max(...[interval.value!, interval.low!, interval.high!].map(Math.abs));
        const unit = Math.max(
          half > 0 ? 10 ** (Math.floor(Math.log10(half * 1.0051)) - 1) : 0,
          largest * 1e-14
        );
        for (const key of ['value', 'low', 'high'] as const) {
          const number = rounded[key]!;
          const [was, is] = [interval[key]!, back(number)];
          // Powers of ten are not exact in binary: a billionth of the unit is allowed for them.
          expect(Math.abs(is - was)).toBeLessThanOrEqual(unit * 0.5 * (1 + 1e-9) + Math.abs(was) * 4e-16);
          if (is === 0) expect(Math.abs(was)).toBeLessThanOrEqual(unit * 0.5 * (1 + 1e-9));
          else expect(Math.sign(is)).toBe(Math.sign(was));
        }
      }),
      { numRuns: 2000 }
    );
  });

  it('value and limits end at the same decimal and share their power', () => {
    fc.assert(
      fc.property(intervals, (interval) => {
        const { value, low, high } = roundToUncertainty(interval)!;
        const others = [value, low!, high!].filter(({ digits }) => digits !== '0');
        expect(new Set(others.map(({ power }) => power)).size).toBeLessThanOrEqual(1);
        if (others.some(({ digits }) => digits.includes('.'))) expect(new Set(others.map(step)).size).toBe(1);
      }),
      { numRuns: 2000 }
    );
  });

  it('the half-width of what is printed has two digits, give or take the rounding of its ends', () => {
    fc.assert(
      fc.property(intervals, (interval) => {
        const half = deciding(interval);
        fc.pre(half > 1e-11 * Math.abs(interval.value!));
        const rounded = roundToUncertainty(interval)!;
        const whole = (interval.high! - interval.low!) / 2;
        const printed = (back(rounded.high!) - back(rounded.low!)) / 2;
        const unit = 10 ** (Math.floor(Math.log10(Number(half.toPrecision(2)) * (1 + 1e-12))) - 1);
        expect(Math.round(half / unit)).toBeGreaterThanOrEqual(10);
        expect(Math.round(half / unit)).toBeLessThanOrEqual(99);
        expect(Math.abs(printed - whole)).toBeLessThanOrEqual(
          unit * 0.5 * (1 + 1e-6) + Math.abs(interval.value!) * 1e-15
        );
      }),
      { numRuns: 2000 }
    );
  });
});
