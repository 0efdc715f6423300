import { logGammaTail } from '$lib/stats/numerics/log-gamma-tail';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tailError } from './reference';

describe('logGammaTail', () => {
  it('is exponential for a = 1', () => {
    for (const x of [1e-12, 0.3, 1, 1.01, 5, 700, 5000]) {
      expect(tailError(logGammaTail('upper', 1, x), -x)).toBeLessThan(1e-13);
    }
  });

  it('splits 1, and obeys P(a+1, x) = P(a, x) − x^a e^{−x}/Γ(a+1)', () => {
    const shape = fc.oneof(
      fc.double({ min: 0.3, max: 30, noNaN: true }),
      fc.double({ min: 30, max: 1e5, noNaN: true })
    );
    fc.assert(
      fc.property(shape, fc.double({ min: -6, max: 6, noNaN: true }), (a, z) => {
        const x = Math.max(0.05, a + z * Math.sqrt(a));
        const lower = Math.exp(logGammaTail('lower', a, x));
        const upper = Math.exp(logGammaTail('upper', a, x));
        expect(lower + upper).toBeCloseTo(1, 13);
        const next = Math.exp(logGammaTail('upper', a + 1, x));
        const climbed = Math.exp(logGammaTail('upper', a + 2, x));
        // Two steps of the recurrence have the ratio x/(a+1).
        expect(climbed - next).toBeCloseTo(((next - upper) * x) / (a + 1), 12);
      }),
      { numRuns: 1000 }
    );
  });

  it('answers at the ends and refuses the rest', () => {
    expect(logGammaTail('lower', 2, 0)).toBe(-Infinity);
    expect(logGammaTail('upper', 2, 0)).toBe(0);
    expect(logGammaTail('lower', 2, Infinity)).toBe(0);
    expect(logGammaTail('upper', 2, Infinity)).toBe(-Infinity);
    expect(logGammaTail('upper', 0, 1)).toBeNaN();
    expect(logGammaTail('upper', 1, -1)).toBeNaN();
    expect(logGammaTail('upper', NaN, 1)).toBeNaN();
  });
});
