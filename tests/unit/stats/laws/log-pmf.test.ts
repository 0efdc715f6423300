import { lawWindow } from '$lib/stats/laws/law-window';
import { logPmf } from '$lib/stats/laws/log-pmf';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, enumerate, innerProbability, lawOf, logRecurrence } from './enumerate';
import { exactCases } from './pmf-reference';

/** Error of a logarithm: of the probability itself down to 1e-300, relative to the logarithm below. */
function error(got: number, want: number): number {
  return got === want ? 0 : Math.abs(got - want) / Math.max(1, -want / 690);
}

describe('logPmf', () => {
  it('equals exact rational arithmetic, far below the smallest double too', () => {
    let below = 0;
    for (const { name, p, poissonPart, pmf } of exactCases) {
      pmf.forEach((cell, n) => {
        const want = typeof cell === 'number' ? Math.log(cell) : cell[1];
        if (typeof cell !== 'number') below++;
        expect(error(logPmf(lawOf(p, poissonPart), n), want), `${name}, count ${n}`).toBeLessThan(1e-10);
      });
    }
    expect(below).toBeGreaterThan(50);
  });

  it('equals the sum over all 2^N outcomes', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 8 }), (p) => {
        enumerate(p).forEach((want, n) => {
          if (want > 1e-290) expect(Math.abs(logPmf(lawOf(p), n) - Math.log(want))).toBeLessThan(1e-10);
          if (want === 0) expect(logPmf(lawOf(p), n)).toBeLessThan(-660);
        });
      }),
      { numRuns: 200 }
    );
  });

  it('by tilting equals the window by convolution: two algorithms', () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ p: anyProbability, trials: fc.integer({ min: 1, max: 60 }) }), {
          minLength: 1,
          maxLength: 5
        }),
        fc.oneof(fc.constant(0), fc.double({ min: 0.1, max: 30, noNaN: true })),
        (levels, poissonPart) => {
          const law = { levels, poissonPart };
          const { first, values, scale } = lawWindow(law);
          for (let k = 0; k < values.length; k += 1 + (values.length >> 4)) {
            const want = Math.log(values[k] / scale);
            if (want > -690) expect(Math.abs(logPmf(law, first + k) - want)).toBeLessThan(1e-10);
          }
        }
      ),
      { numRuns: 80 }
    );
  });

  it('equals a recurrence in logarithms for 100 trials, to −1000 and beyond', () => {
    const p = fc.sample(innerProbability, { numRuns: 100, seed: 5 }).map((one) => one ** 8);
    const want = logRecurrence(p);
    expect(want[100]).toBeLessThan(-1000);
    want.forEach((value, n) => expect(error(logPmf(lawOf(p), n), value)).toBeLessThan(1e-10));
  });

  it('is the Poisson pmf for a Poisson part alone, and −Infinity off the support', () => {
    const rare = { levels: [], poissonPart: 2.5 };
    for (const n of [0, 1, 7, 300, 5000])
      expect(error(logPmf(rare, n), logPoissonPmf(n, 2.5))).toBeLessThan(1e-11);
    const law = lawOf([1, 0.5, 0]);
    for (const n of [-1, 0, 3, 0.5, NaN]) expect(logPmf(law, n)).toBe(-Infinity);
    expect(logPmf(law, 1)).toBeCloseTo(-Math.LN2, 14);
    expect(logPmf(lawOf([1, 0.5], 3), 0)).toBe(-Infinity);
    expect(logPmf(lawOf([1, 0.5], 3), 1)).toBeCloseTo(-3 - Math.LN2, 13);
  });
});
