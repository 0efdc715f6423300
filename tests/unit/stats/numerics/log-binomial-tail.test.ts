import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, relativeError, tailError } from './reference';

describe('logBinomialTail', () => {
  it('agrees with exact sums (n ≤ 400) and 40-digit integrals up to n = 2^53', () => {
    for (const { side, row } of reference('logBinomialTail')) {
      const [, k, n, p, want] = row;
      expect(tailError(logBinomialTail(side, k, n, p), want), `${side} ${k} of ${n} at ${p}`).toBeLessThan(
        2e-12
      );
    }
  });

  it('agrees with enumeration of all outcomes for n ≤ 8', () => {
    for (let n = 1; n <= 8; n++) {
      for (const p of [0.02, 0.4, 0.85]) {
        const pmf = new Array<number>(n + 1).fill(0);
        for (let outcome = 0; outcome < 2 ** n; outcome++) {
          const ones = outcome.toString(2).replaceAll('0', '').length;
          pmf[ones] += p ** ones * (1 - p) ** (n - ones);
        }
        for (let k = 0; k <= n; k++) {
          const high = pmf.slice(k).reduce((a, b) => a + b);
          const low = pmf.slice(0, k + 1).reduce((a, b) => a + b);
          expect(relativeError(Math.exp(logBinomialTail('high', k, n, p)), high)).toBeLessThan(1e-13);
          expect(relativeError(Math.exp(logBinomialTail('low', k, n, p)), low)).toBeLessThan(1e-13);
        }
      }
    }
  });

  it('agrees with sums of the pmf down to 1e-290 (second algorithm)', () => {
    for (const n of [12, 64, 300, 1200, 6000]) {
      for (const p of [1e-9, 0.001, 0.1, 0.5, 0.77]) {
        let high = 0;
        for (let k = n; k >= 0; k -= 1) {
          high += Math.exp(logBinomialPmf(k, n, p));
          if (high > 1e-290 && k % 7 === 0) {
            expect(relativeError(Math.exp(logBinomialTail('high', k, n, p)), high)).toBeLessThan(1e-11);
          }
        }
      }
    }
  });

  const problem = fc.record({
    n: fc.oneof(fc.integer({ min: 1, max: 5000 }), fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER })),
    p: fc.oneof(
      fc.double({ min: 1e-12, max: 1, noNaN: true }),
      fc.double({ min: -27, max: -0.01, noNaN: true }).map(Math.exp)
    ),
    z: fc.double({ min: -12, max: 12, noNaN: true })
  });
  const countOf = ({ n, p, z }: { n: number; p: number; z: number }) =>
    Math.min(n, Math.max(0, Math.round(n * p + z * Math.sqrt(n * p * (1 - p)))));

  it('splits 1 into both tails, and the mirror image exchanges them', () => {
    fc.assert(
      fc.property(problem, (given) => {
        const { n, p } = given;
        const k = countOf(given);
        const high = logBinomialTail('high', k, n, p);
        expect(Math.exp(high) + Math.exp(logBinomialTail('low', k - 1, n, p))).toBeCloseTo(1, 12);
        // 1 − p is exact only from ½ on.
        if (p >= 0.5) expect(tailError(logBinomialTail('low', n - k, n, 1 - p), high)).toBeLessThan(1e-11);
      }),
      { numRuns: 2000 }
    );
  });

  it('differs from the next tail by one probability', () => {
    fc.assert(
      fc.property(problem, (given) => {
        const { n, p } = given;
        const k = countOf(given);
        const here = logBinomialTail('high', k, n, p);
        const next = logBinomialTail('high', k + 1, n, p);
        expect(next).toBeLessThanOrEqual(here);
        const difference = 1 - Math.exp(next - here);
        // Near the mean of a large n one probability is a difference of two almost equal tails.
        expect(Math.abs(difference - Math.exp(logBinomialPmf(k, n, p) - here))).toBeLessThan(1e-12);
      }),
      { numRuns: 2000 }
    );
  });

  it('says something far below the smallest double', () => {
    // P(X ≥ n) = p^n.
    expect(logBinomialTail('high', 5000, 5000, Math.exp(-1))).toBeCloseTo(-5000, 9);
    // Between the pmf and Chernoff's bound, which differ by ln of √(2πkq) at most here.
    const log = logBinomialTail('high', 9000, 10000, 0.1);
    const pmf = logBinomialPmf(9000, 10000, 0.1);
    expect(log).toBeGreaterThan(pmf);
    expect(log - pmf).toBeCloseTo(-Math.log1p(-(1000 / 9001) / 9), 3);
  });

  it('gives the value of science: Bin(100, 0.1), n ≥ 20', () => {
    // R 4.2: pbinom(19, 100, 0.1, lower.tail = FALSE) = 0.001978561
    expect(Math.exp(logBinomialTail('high', 20, 100, 0.1))).toBeCloseTo(0.001978561, 9);
  });

  it('answers at the ends and refuses the rest', () => {
    expect(logBinomialTail('high', 0, 5, 0.2)).toBe(0);
    expect(logBinomialTail('low', 5, 5, 0.2)).toBe(0);
    expect(logBinomialTail('high', 6, 5, 0.2)).toBe(-Infinity);
    expect(logBinomialTail('low', -1, 5, 0.2)).toBe(-Infinity);
    expect(logBinomialTail('high', 1, 5, 0)).toBe(-Infinity);
    expect(logBinomialTail('low', 4, 5, 1)).toBe(-Infinity);
    expect(logBinomialTail('high', 5, 5, 1)).toBe(0);
    expect(logBinomialTail('low', 0, 5, 0)).toBe(0);
    expect(logBinomialTail('high', 2.3, 5, 0.2)).toBe(logBinomialTail('high', 3, 5, 0.2));
    expect(logBinomialTail('low', 2.3, 5, 0.2)).toBe(logBinomialTail('low', 2, 5, 0.2));
    expect(logBinomialTail('high', 1, 5, -0.1)).toBeNaN();
    expect(logBinomialTail('high', 1, 5.5, 0.1)).toBeNaN();
    expect(logBinomialTail('high', NaN, 5, 0.1)).toBeNaN();
  });
});
