import { ratio } from '$lib/stats/moments/ratio';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('ratio', () => {
  it('is the quotient of doubles where both fit in one', () => {
    const whole = fc.bigInt({ min: -(2n ** 53n), max: 2n ** 53n });
    fc.assert(
      fc.property(whole, fc.bigInt({ min: 1n, max: 2n ** 53n }), (a, b) => {
        expect(Math.abs(ratio(a, b) - Number(a) / Number(b))).toBeLessThanOrEqual(
          Math.abs(Number(a) / Number(b)) * 2 ** -52
        );
      })
    );
  });

  it('holds at both ends of the range of doubles', () => {
    expect(ratio(10n ** 400n, 10n ** 100n)).toBe(1e300);
    expect(ratio(3n, 10n ** 300n) / 3e-300).toBeCloseTo(1, 14);
    expect(ratio(10n ** 400n, 1n)).toBe(Infinity);
    expect(ratio(-1n, 10n ** 400n)).toBe(-0);
  });
});
