import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';
import { logChoose } from '$lib/stats/numerics/log-choose';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, tailError } from './reference';

describe('logBinomialPmf', () => {
  it('agrees with exact fractions and 40 digits, up to n = 2^53', () => {
    for (const { row } of reference('logBinomialPmf')) {
      const [k, n, p, want] = row;
      expect(tailError(logBinomialPmf(k, n, p), want), `${k}, ${n}, ${p}`).toBeLessThan(5e-13);
    }
  });

  it('agrees with ln C(n,k) + k ln p + (n−k) ln q', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 2000 }),
        fc.double({ min: 0, max: 1 }),
        fc.double({ min: 1e-9, max: 0.999, noNaN: true }),
        (n, share, p) => {
          const k = Math.round(n * (share || 0));
          const plain = logChoose(n, k) + k * Math.log(p) + (n - k) * Math.log1p(-p);
          expect(Math.abs(logBinomialPmf(k, n, p) - plain)).toBeLessThan(
            1e-14 * (10 + n + Math.abs(k * Math.log(p)))
          );
        }
      )
    );
  });

  it('sums to 1', () => {
    for (const [n, p] of [
      [1, 0.2],
      [12, 0.3377],
      [500, 0.01],
      [3000, 0.6]
    ]) {
      let sum = 0;
      for (let k = 0; k <= n; k++) sum += Math.exp(logBinomialPmf(k, n, p));
      expect(sum).toBeCloseTo(1, 13);
    }
  });

  it('answers at the ends and refuses the rest', () => {
    expect(logBinomialPmf(0, 5, 0)).toBe(0);
    expect(logBinomialPmf(1, 5, 0)).toBe(-Infinity);
    expect(logBinomialPmf(5, 5, 1)).toBe(0);
    expect(logBinomialPmf(4, 5, 1)).toBe(-Infinity);
    expect(logBinomialPmf(0, 0, 0.3)).toBeCloseTo(0, 15);
    expect(logBinomialPmf(6, 5, 0.5)).toBe(-Infinity);
    expect(logBinomialPmf(2.5, 5, 0.5)).toBe(-Infinity);
    expect(logBinomialPmf(2, 5, 1.1)).toBeNaN();
    expect(logBinomialPmf(2, 5.5, 0.1)).toBeNaN();
    expect(logBinomialPmf(NaN, 5, 0.1)).toBeNaN();
  });
});
