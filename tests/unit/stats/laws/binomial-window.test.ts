import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability } from './enumerate';

describe('binomialWindow', () => {
  it('equals C(m, n) p^n (1−p)^(m−n) in whole numbers', () => {
    // p = 1/4: every probability is a whole number over 4^6.
    const { first, values, scale } = binomialWindow(6, 0.25);
    expect(first).toBe(0);
    expect(Array.from(values, (value) => Math.round((value / scale) * 4 ** 6 * 1e6) / 1e6)).toEqual([
      729, 1458, 1215, 540, 135, 18, 1
    ]);
  });

  it('agrees with the logarithmic form, up to a million trials and down to 1e-300', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 1_000_000 }), anyProbability, (trials, p) => {
        const { first, values, scale } = binomialWindow(trials, p);
        const stride = Math.max(1, values.length >> 5);
        for (let k = 0; k < values.length; k += stride) {
          const got = Math.log(values[k] / scale);
          if (got < -690) continue;
          expect(Math.abs(got - logBinomialPmf(first + k, trials, p))).toBeLessThan(1e-10);
        }
      }),
      { numRuns: 40 }
    );
  });

  it('sums to its scale, and holds one count at the ends', () => {
    const sum = (values: Float64Array) => values.reduce((total, value) => total + value, 0);
    expect(sum(binomialWindow(300, 0.37, 0, 1).values)).toBeCloseTo(1, 13);
    expect(sum(binomialWindow(300, 0.37, 1e-20, 5).values)).toBeCloseTo(5, 12);
    expect(binomialWindow(9, 0, 0, 1)).toEqual({ first: 0, values: Float64Array.of(1), scale: 1 });
    expect(binomialWindow(9, 1, 0, 1)).toEqual({ first: 9, values: Float64Array.of(1), scale: 1 });
    expect(binomialWindow(0, 0.4, 0, 1)).toEqual({ first: 0, values: Float64Array.of(1), scale: 1 });
  });

  it('trimmed at 1e-20 misses less than 1e-17 of the probability', () => {
    const whole = binomialWindow(100_000, 0.2, 0, 1);
    const cut = binomialWindow(100_000, 0.2, 1e-20, 1);
    let missing = 0;
    whole.values.forEach((value, k) => {
      const n = whole.first + k;
      if (n < cut.first || n >= cut.first + cut.values.length) missing += value;
    });
    expect(missing).toBeGreaterThan(0);
    expect(missing).toBeLessThan(1e-17);
  });
});
