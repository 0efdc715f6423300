import { normalCdf } from '$lib/stats/numerics/normal-cdf';
import { normalQuantile } from '$lib/stats/numerics/normal-quantile';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('normalQuantile', () => {
  it('agrees with 40 digits (SciPy beside them) down to 1e-300', () => {
    for (const { row } of reference('normalQuantile')) {
      expect(relativeError(normalQuantile(row[0]), row[1]), `p = ${row[0]}`).toBeLessThan(2e-15);
    }
  });

  it('inverts the distribution function', () => {
    fc.assert(
      fc.property(fc.double({ min: -37, max: 5, noNaN: true }), (x) => {
        // Above 0 the cdf itself has rounded: its error over the density.
        const blur = x > 0 ? 1e-15 * Math.exp(x * x) : 0;
        expect(Math.abs(normalQuantile(normalCdf(x)) - x)).toBeLessThan(1e-13 + blur);
      })
    );
  });

  it('answers at the ends and refuses the rest', () => {
    expect(normalQuantile(0.5)).toBe(0);
    expect(normalQuantile(0)).toBe(-Infinity);
    expect(normalQuantile(1)).toBe(Infinity);
    expect(normalQuantile(-0.1)).toBeNaN();
    expect(normalQuantile(1.1)).toBeNaN();
    expect(normalQuantile(NaN)).toBeNaN();
  });
});
