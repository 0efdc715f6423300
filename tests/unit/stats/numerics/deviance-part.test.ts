import { deviancePart } from '$lib/stats/numerics/deviance-part';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('deviancePart', () => {
  it('agrees with 40 digits', () => {
    for (const { row } of reference('deviancePart')) {
      const [x, mean, want] = row;
      expect(relativeError(deviancePart(x, mean), want), `${x}, ${mean}`).toBeLessThan(4e-15);
    }
  });

  it('is not negative, and 0 only at the mean', () => {
    const positive = fc.double({ min: 1e-200, max: 1e200, noNaN: true });
    fc.assert(
      fc.property(positive, positive, (x, mean) => {
        const part = deviancePart(x, mean);
        return x === mean ? part === 0 : part >= 0;
      })
    );
  });

  it('takes a difference known better than the subtraction gives it', () => {
    // D ≈ d²/2m; the doubles 2^53 and 2^53 cannot show a difference of 0.25.
    expect(deviancePart(2 ** 53, 2 ** 53, 0.25)).toBeCloseTo(0.0625 / 2 ** 54, 30);
    expect(deviancePart(2 ** 53, 2 ** 53)).toBe(0);
  });

  it('answers at the ends', () => {
    expect(deviancePart(0, 3)).toBe(3);
    expect(deviancePart(0, 0)).toBe(0);
    expect(deviancePart(2, 0)).toBe(Infinity);
    expect(deviancePart(-1, 2)).toBeNaN();
    expect(deviancePart(1, -2)).toBeNaN();
  });
});
