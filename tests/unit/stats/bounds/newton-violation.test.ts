import { newtonViolation } from '$lib/stats/bounds/newton-violation';
import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addTrials } from './trials';

describe('newtonViolation', () => {
  it('finds nothing in any trials', () => {
    const share = fc.oneof(fc.double({ min: 1e-6, max: 1, noNaN: true }), fc.constantFrom(0, 1));
    fc.assert(
      fc.property(fc.array(share, { minLength: 1, maxLength: 25 }), (p) => {
        const pmf = addTrials(p);
        expect(newtonViolation(pmf, p.length)?.excess ?? 0).toBeLessThan(1e-11);
        expect(newtonViolation(pmf, null)?.excess ?? 0).toBeLessThan(1e-11);
      })
    );
  });

  it('refuses a log-concave pmf that no trials have', () => {
    // (1, 4, 6)/11: G has the zeros −1/3 ± 0.2357i, so it is no Poisson-binomial law. Newton:
    // f₀f₂·2·2/f₁² = 24/16.
    const found = newtonViolation([1 / 11, 4 / 11, 6 / 11], 2);
    expect(found?.count).toBe(1);
    expect(found?.excess).toBeCloseTo(Math.log(1.5), 14);
  });

  it('is an equality for a binomial, with N, and for a Poisson pmf, without', () => {
    const binomial = Array.from({ length: 41 }, (_, n) => Math.exp(logBinomialPmf(n, 40, 0.3)));
    expect(Math.abs(newtonViolation(binomial, 40)?.excess ?? NaN)).toBeLessThan(1e-12);
    expect(newtonViolation(binomial, 39)?.excess).toBe(Infinity);
    expect(newtonViolation(binomial, null)?.excess).toBeLessThan(-0.02);
    const poisson = Array.from({ length: 80 }, (_, n) => Math.exp(logPoissonPmf(n, 9)));
    expect(Math.abs(newtonViolation(poisson, null)?.excess ?? NaN)).toBeLessThan(1e-12);
    expect(newtonViolation(poisson, 100)?.excess).toBeGreaterThan(0.01);
  });

  it('does not underflow, and minds neither scale nor zeros at the ends', () => {
    const found = newtonViolation([0, 1e-200, 3e-200, 1e-200, 0], 10);
    const scaled = newtonViolation([0, 1e200, 3e200, 1e200, 0], 10);
    expect(found?.count).toBe(2);
    expect(found?.excess).toBeCloseTo(Math.log((1.5 * 1.125) / 9), 13);
    expect(scaled?.excess).toBeCloseTo(found?.excess ?? NaN, 12);
  });

  it('finds gaps, and says when there is nothing to try', () => {
    expect(newtonViolation([0.5, 0, 0.5], 2)).toEqual({ excess: Infinity, count: 1 });
    expect(newtonViolation([0.5, 0, 0, 0.5], 3)).toEqual({ excess: Infinity, count: 1 });
    expect(newtonViolation([0.5, 0.3, 0.2], 1)).toEqual({ excess: Infinity, count: 2 });
    expect(newtonViolation([0.5, 0.5], 1)).toBeNull();
    expect(newtonViolation([], null)).toBeNull();
    expect(newtonViolation([0, 0], null)).toBeNull();
    expect(newtonViolation([0.5, -0.1, 0.6], null)?.excess).toBeNaN();
  });
});
