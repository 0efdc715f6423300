import { poissonWindow } from '$lib/stats/laws/poisson-window';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { relative } from './enumerate';
import { exactCases } from './pmf-reference';

describe('poissonWindow', () => {
  it('equals 80-digit decimals (fixtures/reference/pmf_exact.py)', () => {
    const { poissonPart, pmf } = exactCases.find(({ name }) => name === 'rare events 3.2')!;
    const { first, values, scale } = poissonWindow(poissonPart);
    expect(first).toBe(0);
    pmf.forEach((want, n) => expect(relative(values[n] / scale, Number(want))).toBeLessThan(1e-13));
  });

  it('agrees with the logarithmic form down to 1e-300, for means up to a million', () => {
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 1e6, noNaN: true }), (mean) => {
        const { first, values, scale } = poissonWindow(mean);
        const stride = Math.max(1, values.length >> 5);
        for (let k = 0; k < values.length; k += stride) {
          const got = Math.log(values[k] / scale);
          if (got < -690) continue;
          expect(Math.abs(got - logPoissonPmf(first + k, mean))).toBeLessThan(1e-10);
        }
      }),
      { numRuns: 40 }
    );
  });

  it('sums to its scale, and mean 0 is one count', () => {
    expect(poissonWindow(81.5, 0, 1).values.reduce((sum, f) => sum + f, 0)).toBeCloseTo(1, 13);
    expect(poissonWindow(0, 0, 1)).toEqual({ first: 0, values: Float64Array.of(1), scale: 1 });
  });
});
