import { clopperPearson } from '$lib/stats/numerics/clopper-pearson';
import { findRoot } from '$lib/stats/numerics/find-root';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('clopperPearson', () => {
  it('agrees with 40 digits (SciPy beside them), up to n = 2^53 and 1 − 1e-6', () => {
    for (const { row } of reference('clopperPearson')) {
      const [k, n, level, low, high] = row;
      const interval = clopperPearson(k, n, level);
      expect(relativeError(interval.low, low), `low of ${k}/${n} at ${level}`).toBeLessThan(1e-13);
      expect(relativeError(interval.high, high), `high of ${k}/${n} at ${level}`).toBeLessThan(1e-13);
    }
  });

  it('gives the intervals of printed tables', () => {
    // 95 %: R 4.2 binom.test(k, 10)$conf.int; also in Clopper & Pearson's charts to two digits.
    const table = [
      [0, 0, 0.308497],
      [1, 0.0025286, 0.445016],
      [5, 0.187086, 0.812914]
    ];
    for (const [k, low, high] of table) {
      expect(clopperPearson(k, 10).low).toBeCloseTo(low, 6);
      expect(clopperPearson(k, 10).high).toBeCloseTo(high, 6);
    }
  });

  const problem = fc
    .record({
      n: fc.oneof(fc.integer({ min: 1, max: 300 }), fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER })),
      share: fc.double({ min: 0, max: 1, noNaN: true }),
      level: fc.oneof(fc.double({ min: 0.01, max: 0.999, noNaN: true }), fc.constant(1 - 1e-6))
    })
    .map(({ n, share, level }) => ({ n, k: Math.round(n * share), level }));

  it('puts half the doubt beyond each end', () => {
    fc.assert(
      fc.property(problem, ({ n, k, level }) => {
        const { low, high } = clopperPearson(k, n, level);
        const want = Math.log((1 - level) / 2);
        // The last digit of p moves z by √(np/(1−p)) digits, and the log of the tail by the hazard at z, under z + 1.
        const hazard = Math.sqrt(-2 * want) + 1;
        const blur = (p: number) => 1e-11 + 2.3e-16 * hazard * Math.sqrt((n * p) / (1 - p));
        if (k > 0 && low < 0.9)
          expect(Math.abs(logBinomialTail('high', k, n, low) - want)).toBeLessThan(blur(low));
        if (k < n && high < 0.9) {
          expect(Math.abs(logBinomialTail('low', k, n, high) - want)).toBeLessThan(blur(high));
        }
        expect(low).toBeLessThanOrEqual(k / n);
        expect(high).toBeGreaterThanOrEqual(k / n);
      }),
      { numRuns: 500 }
    );
  });

  it('is the mirror image of itself', () => {
    fc.assert(
      fc.property(problem, ({ n, k, level }) => {
        const { high } = clopperPearson(k, n, level);
        expect(Math.abs(1 - high - clopperPearson(n - k, n, level).low)).toBeLessThan(1e-15);
      }),
      { numRuns: 500 }
    );
  });

  it('agrees with a bracketed root (second algorithm)', () => {
    for (const [k, n] of [
      [1, 7],
      [3, 200],
      [40, 64],
      [500, 100_000]
    ]) {
      const want = Math.log(0.025);
      const low = findRoot((p) => logBinomialTail('high', k, n, p) - want, 1e-9, k / n);
      expect(relativeError(clopperPearson(k, n).low, low)).toBeLessThan(1e-13);
    }
  });

  it('answers at the ends and refuses the rest', () => {
    expect(clopperPearson(0, 0)).toEqual({ low: 0, high: 1 });
    expect(clopperPearson(0, 5).low).toBe(0);
    expect(clopperPearson(5, 5).high).toBe(1);
    expect(relativeError(clopperPearson(5, 5).low, 0.025 ** 0.2)).toBeLessThan(1e-14);
    for (const [k, n, level] of [
      [6, 5, 0.95],
      [-1, 5, 0.95],
      [1.5, 5, 0.95],
      [1, 5, 1],
      [1, 5, 0],
      [NaN, 5, 0.9]
    ]) {
      expect(clopperPearson(k, n, level)).toEqual({ low: NaN, high: NaN });
    }
  });
});
