import { tailThresholds, type TailSearch } from '$lib/stats/bounds/tail-thresholds';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { logChoose } from '$lib/stats/numerics/log-choose';
import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** Every threshold in turn, as the definition says (second algorithm). */
function walk({ side, first, last, logBound, counts, shots }: TailSearch) {
  const step = side === 'high' ? 1 : -1;
  let best = { count: NaN, logP: Infinity };
  let thresholds = 0;
  for (let n = first; step * (last - n) >= 0; n += step) {
    thresholds++;
    const tail = counts.filter(([c]) => step * (c - n) >= 0).reduce((sum, [, h]) => sum + h, 0);
    const logP = logBinomialTail('high', tail, shots, Math.exp(logBound(n)));
    if (logP < best.logP) best = { count: n, logP };
    if (shots * Math.exp(logBound(n)) < 1e-9) break;
  }
  return thresholds === 0 ? null : { ...best, thresholds };
}

describe('tailThresholds', () => {
  it('agrees with a walk over every threshold', () => {
    const rows = fc
      .uniqueArray(fc.tuple(fc.integer({ min: 0, max: 64 }), fc.integer({ min: 0, max: 40 })), {
        minLength: 1,
        maxLength: 25,
        selector: ([n]) => n
      })
      .map((list) => list.sort((a, b) => a[0] - b[0]));
    const mean = fc.double({ min: 0.01, max: 63.9, noNaN: true });
    fc.assert(
      fc.property(rows, mean, fc.constantFrom('high' as const, 'low' as const), (counts, mu, side) => {
        const shots = counts.reduce((sum, [, h]) => sum + h, 1);
        const search: TailSearch = {
          side,
          first: side === 'high' ? Math.ceil(mu + 1) : Math.floor(mu - 1),
          last: side === 'high' ? 64 : 0,
          logBound: (n) => logBinomialTail(side, n, 64, mu / 64),
          counts,
          shots
        };
        const want = walk(search);
        const got = tailThresholds(search);
        if (!want) expect(got).toBeNull();
        else expect(got).toMatchObject(want);
      }),
      { numRuns: 1000 }
    );
  });

  it('keeps tail probabilities down to 1e-300 and below', () => {
    // Four of 1000 shots at 12, where Poisson(3) allows 7e-5.
    const found = tailThresholds({
      side: 'high',
      first: 4,
      last: Infinity,
      logBound: (n) => logPoissonTail('high', n, 3),
      counts: [
        [3, 996],
        [12, 4]
      ],
      shots: 1000
    });
    const bound = logPoissonTail('high', 12, 3);
    expect(found?.count).toBe(12);
    expect(found?.logP).toBeCloseTo(logBinomialTail('high', 4, 1000, Math.exp(bound)), 12);
    const far = tailThresholds({
      side: 'high',
      first: 4,
      last: 400,
      logBound: (n) => -n,
      counts: [
        [0, 600],
        [20, 400]
      ],
      shots: 1000
    });
    // C(1000,400) e^{−8000} (1 − e^{−20})^600; the next count adds a part 1.5·e^{−20}.
    expect(far?.count).toBe(20);
    expect(far?.logP).toBeCloseTo(logChoose(1000, 400) - 8000 - 600 * Math.exp(-20) + 1.5 * Math.exp(-20), 9);
    // 1000·e^{−28} is the first below 1e-9: 4 … 28.
    expect(far?.thresholds).toBe(25);
  });

  it('does not walk: a mean of 1e12 has millions of thresholds', () => {
    let calls = 0;
    const found = tailThresholds({
      side: 'high',
      first: 1e12 + 1,
      last: Infinity,
      logBound: (n) => (calls++, logPoissonTail('high', n, 1e12)),
      counts: [
        [1e12, 990],
        [1e12 + 5e6, 10]
      ],
      shots: 1000
    });
    expect(found?.count).toBe(1e12 + 5e6);
    expect(found?.thresholds).toBeGreaterThan(6e6);
    expect(calls).toBeLessThan(100);
  });

  it('says when there is none', () => {
    const search = { side: 'high' as const, first: 9, last: 8, logBound: () => -1, counts: [], shots: 5 };
    expect(tailThresholds(search)).toBeNull();
  });
});
