import { ceiling } from '$lib/stats/bounds/ceiling';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('ceiling', () => {
  it('is the variance of equal trials, and of a Poisson count for unknown N', () => {
    expect(ceiling(10, 100)).toBeCloseTo(100 * 0.1 * 0.9, 13);
    expect(ceiling(3.871549, null)).toBe(3.871549);
    expect(ceiling(1, 1)).toBe(0);
    expect(ceiling(0, 0)).toBe(0);
  });

  it('lies above the variance of any trials', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 30 }),
        (p) => {
          const mean = p.reduce((a, b) => a + b);
          const variance = p.reduce((sum, q) => sum + q * (1 - q), 0);
          expect(variance).toBeLessThanOrEqual(ceiling(Math.min(mean, p.length), p.length) + 1e-12);
          expect(variance).toBeLessThanOrEqual(ceiling(mean, null) + 1e-12);
        }
      )
    );
  });

  it('refuses means out of range', () => {
    expect(ceiling(-1, 10)).toBeNaN();
    expect(ceiling(11, 10)).toBeNaN();
    expect(ceiling(NaN, null)).toBeNaN();
  });
});
