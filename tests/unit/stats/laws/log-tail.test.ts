import { logTail } from '$lib/stats/laws/log-tail';
import { lawWindow } from '$lib/stats/laws/law-window';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import { generator } from '$lib/stats/random/generator';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, enumerate, lawOf } from './enumerate';
import { asLog, exactPmf } from './exact-pmf';
import { packageCases } from './pmf-reference';

/** ln 1e-200. */
const deep = -460.5;

describe('logTail', () => {
  it.each([
    ['uniform', 40, 1],
    ['uniform', 400, 1],
    ['rare', 800, 0.03]
  ])('of %s probabilities, N = %i, equals exact arithmetic to 1e-11 down to 1e-200', (_, trials, share) => {
    const random = generator(5, trials);
    const parts = Array.from({ length: trials }, () => 1 + Math.floor(1023 * share * random.next()));
    const law = lawOf(parts.map((part) => part / 1024));
    const f = exactPmf(parts);
    let below = 0n;
    let above = f.reduce((sum, one) => sum + one, 0n);
    let held = 0;
    for (let n = 0; n <= trials; n++) {
      below += f[n];
      for (const [side, tail] of [
        ['low', below],
        ['high', above]
      ] as const) {
        const want = asLog(tail, trials);
        if (want < deep) continue;
        expect(Math.abs(logTail(law, side, n) - want), `${side} ${n}`).toBeLessThan(1e-11);
        held += 1;
      }
      above -= f[n];
    }
    expect(held).toBeGreaterThan(trials / 4);
  });

  it('equals the sum over all 2^N outcomes', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 9 }), (p) => {
        const f = enumerate(p);
        for (let n = 0; n <= p.length + 1; n++) {
          const high = f.slice(n).reduceRight((sum, one) => one + sum, 0);
          const low = f.slice(0, n + 1).reduce((sum, one) => sum + one, 0);
          if (high > 1e-280)
            expect(logTail(lawOf(p), 'high', n), `high ${n}`).toBeCloseTo(Math.log(high), 11);
          if (low > 1e-280) expect(logTail(lawOf(p), 'low', n), `low ${n}`).toBeCloseTo(Math.log(low), 11);
        }
      }),
      { numRuns: 300 }
    );
  });

  it.each([
    [10_000, 97],
    [100_000, 997]
  ])('equals the sum of the whole pmf to 1e-11, N = %i', (trials, every) => {
    const random = generator(6, trials);
    const p = Array.from({ length: trials }, () => random.next());
    const { first, values, scale } = lawWindow(lawOf(p));
    // From the far ends, so that the small terms come first.
    let sum = 0;
    for (let i = values.length - 1; i > 0; i--) {
      sum += values[i] / scale;
      const n = first + i;
      if (sum > 1e-200 && sum < 0.4 && n % every === 0) {
        expect(Math.abs(logTail(lawOf(p), 'high', n) - Math.log(sum)), `${n}`).toBeLessThan(1e-11);
      }
    }
  });

  it('equals pbinom and ppois of equal trials and of rare events, and ppbinom of R’s PoissonBinomial 1.2.5', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 300 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (trials, p) => {
          const law = { levels: [{ p, trials }], poissonPart: 0 };
          for (let n = 0; n <= trials; n += 1 + Math.floor(trials / 7)) {
            expect(logTail(law, 'high', n)).toBeCloseTo(logBinomialTail('high', n, trials, p), 9);
          }
        }
      ),
      { numRuns: 60 }
    );
    for (const n of [0, 3, 9, 40, 200]) {
      for (const side of ['high', 'low'] as const)
        expect(logTail({ levels: [], poissonPart: 7.5 }, side, n)).toBeCloseTo(
          logPoissonTail(side, n, 7.5),
          10
        );
    }
    for (const { kind, trials, p, cdf, above } of packageCases) {
      for (let n = 0; n < trials; n++) {
        const name = `${kind} ${trials}, ${n}`;
        if (cdf[n] !== null) expect(logTail(lawOf(p), 'low', n), name).toBeCloseTo(Math.log(cdf[n]!), 9);
        if (above[n] !== null)
          expect(logTail(lawOf(p), 'high', n + 1), name).toBeCloseTo(Math.log(above[n]!), 9);
      }
    }
  });

  it('goes where no double does', () => {
    // P(X ≥ 1900) of Bin(2000, 0.1) is about 1e-1700: ln C(2000, 1900) + 1900 ln 0.1 + 100 ln 0.9 bounds it from below.
    expect(logTail({ levels: [{ p: 0.1, trials: 2000 }], poissonPart: 0 }, 'high', 1900)).toBeCloseTo(
      logBinomialTail('high', 1900, 2000, 0.1),
      8
    );
  });

  it('is certain or impossible at and beyond the ends', () => {
    const law = {
      levels: [
        { p: 1, trials: 2 },
        { p: 0.25, trials: 3 },
        { p: 0, trials: 4 }
      ],
      poissonPart: 0
    };
    expect([0, 2].map((n) => logTail(law, 'high', n))).toEqual([0, 0]);
    expect([5, 9].map((n) => logTail(law, 'low', n))).toEqual([0, 0]);
    expect([logTail(law, 'high', 6), logTail(law, 'low', 1)]).toEqual([-Infinity, -Infinity]);
    expect(logTail(law, 'high', 5)).toBeCloseTo(3 * Math.log(0.25), 14);
    expect(logTail(law, 'low', 2)).toBeCloseTo(3 * Math.log(0.75), 14);
  });
});
