import { logHoeffdingTail } from '$lib/stats/bounds/log-hoeffding-tail';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addTrials } from './trials';

// Whole multiples of 2^-40, so that the mean is exact: a mean rounded by one part in 2^53 may reach N, where the
// bound is 1 or 0, while the trials themselves, one of them 1 − 2^-53, have not.
const probability = fc.integer({ min: 0, max: 2 ** 40 }).map((k) => k / 2 ** 40);
const trialList = fc.array(fc.oneof(probability, fc.constantFrom(0, 2 ** -40, 1 - 2 ** -40, 1)), {
  minLength: 1,
  maxLength: 25
});

describe('logHoeffdingTail', () => {
  it('lies above the tails of any trials, and below its own Poisson form', () => {
    fc.assert(
      fc.property(trialList, (p) => {
        const pmf = addTrials(p);
        const mean = p.reduce((a, b) => a + b);
        for (let n = 0; n <= p.length; n++) {
          const high = pmf.slice(n).reduce((a, b) => a + b);
          const low = pmf.slice(0, n + 1).reduce((a, b) => a + b);
          const bounds = (['high', 'low'] as const).map((side) => [
            Math.exp(logHoeffdingTail(side, n, mean, p.length)),
            Math.exp(logHoeffdingTail(side, n, mean, null))
          ]);
          expect(high).toBeLessThanOrEqual(bounds[0][0] * (1 + 1e-12));
          expect(low).toBeLessThanOrEqual(bounds[1][0] * (1 + 1e-12));
          expect(bounds[0][0]).toBeLessThanOrEqual(bounds[0][1] * (1 + 1e-12));
          expect(bounds[1][0]).toBeLessThanOrEqual(bounds[1][1] * (1 + 1e-12));
        }
      }),
      { numRuns: 300 }
    );
  });

  it('is reached by equal trials', () => {
    const pmf = addTrials(new Array<number>(30).fill(0.2));
    for (let n = 7; n <= 30; n++) {
      const high = pmf.slice(n).reduce((a, b) => a + b);
      expect(Math.exp(logHoeffdingTail('high', n, 6, 30)) / high).toBeCloseTo(1, 11);
    }
    // R 4.2: pbinom(19, 100, 0.1, lower.tail = FALSE) = 0.001978561
    expect(Math.exp(logHoeffdingTail('high', 20, 10, 100))).toBeCloseTo(0.001978561, 9);
  });

  it('is the trivial bound within one count of the mean', () => {
    expect(logHoeffdingTail('high', 10, 9.2, 64)).toBe(0);
    expect(logHoeffdingTail('high', 10, 9, 64)).toBeLessThan(-0.1);
    expect(logHoeffdingTail('low', 9, 9.5, 64)).toBe(0);
    expect(logHoeffdingTail('low', 8, 9, null)).toBeLessThan(-0.1);
  });

  it('keeps a mean near N apart from N', () => {
    // One trial of 4 misses with 1e-9: P(X ≤ 2) = P(two or more of four miss) ≈ 6·(2.5e-10)².
    const log = logHoeffdingTail('low', 2, 4 - 2 ** -30, 4);
    expect(log).toBeCloseTo(Math.log(6) + 2 * Math.log(2 ** -32), 8);
  });

  it('answers outside the support and refuses means out of range', () => {
    expect(logHoeffdingTail('high', 11, 2, 10)).toBe(-Infinity);
    expect(logHoeffdingTail('low', -1, 2, 10)).toBe(-Infinity);
    expect(logHoeffdingTail('high', 5, 11, 10)).toBeNaN();
    expect(logHoeffdingTail('high', 5, -1, null)).toBeNaN();
  });
});
