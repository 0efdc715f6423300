import { maximise } from '$lib/stats/numerics/maximise';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('maximise', () => {
  it('finds known maxima', () => {
    const sine = maximise(Math.sin, 0, 4, 1e-8);
    expect(sine.at).toBeCloseTo(Math.PI / 2, 7);
    expect(sine.value).toBeCloseTo(1, 15);
    // x^x has its minimum at 1/e.
    expect(maximise((x) => -(x ** x), 0.01, 3, 1e-9).at).toBeCloseTo(1 / Math.E, 7);
    expect(maximise((x) => -Math.abs(x - 0.3), -2, 5, 1e-9).at).toBeCloseTo(0.3, 8);
  });

  it('finds the top of a binomial log-likelihood wherever it lies', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 999 }), (k) => {
        const top = maximise((p) => k * Math.log(p) + (1000 - k) * Math.log1p(-p), 1e-6, 1 - 1e-6, 1e-9);
        expect(top.at).toBeCloseTo(k / 1000, 7);
      })
    );
  });

  it('compares the ends', () => {
    expect(maximise((x) => x, 0, 2, 1e-6)).toEqual({ at: 2, value: 2 });
    expect(maximise((x) => -x, 0, 2, 1e-6)).toEqual({ at: 0, value: -0 });
  });

  it('steps over values that are not numbers', () => {
    const top = maximise((x) => (x < 1 ? NaN : -((x - 1.5) ** 2)), 0, 4, 1e-8);
    expect(top.at).toBeCloseTo(1.5, 6);
  });
});
