import { describe, expect, it } from 'vitest';
import { chainCount } from '$lib/stats/demo/chain-count';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { dispersionSpread } from '$lib/stats/planning/dispersion-spread';
import type { Effect } from '$lib/stats/planning/effect';
import { effectWindow } from '$lib/stats/planning/effect-window';
import { equalCounts } from '$lib/stats/planning/equal-counts';
import { generator } from '$lib/stats/random/generator';

const pmf = (effect: Effect): number[] => {
  const { first, values, scale } = effectWindow(effect)!;
  return [...new Array<number>(first).fill(0), ...Array.from(values, (value) => value / scale)];
};

describe('effectWindow', () => {
  it('of pairs is the beta-binomial law: uniform for a = b = 1', () => {
    // a + b = 1/ρ − 1 = 2 and p = ½.
    const law = pmf({ kind: 'pairs', size: 1 / 3, mean: 5, trials: 10 });
    expect(law).toHaveLength(11);
    law.forEach((f) => expect(f).toBeCloseTo(1 / 11, 14));
  });

  it('of an excess with N unknown is the negative binomial: geometric for excess = mean', () => {
    const law = pmf({ kind: 'excess', size: 2, mean: 2, trials: null });
    // (1/3)(2/3)^n.
    law.slice(0, 40).forEach((f, n) => expect(f / ((1 / 3) * (2 / 3) ** n)).toBeCloseTo(1, 12));
  });

  it.each([
    ['excess', 0.4, 4, 20],
    ['pairs', 0.03, 4, 20],
    ['neighbours', 0.2, 4, 20],
    ['misread', 0.02, 4, 20],
    ['excess', 0.4, 4, null]
  ] as const)('of %s keeps the mean and sums to one', (kind, size, mean, trials) => {
    const law = pmf({ kind, size, mean, trials });
    expect(law.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
    expect(law.reduce((sum, f, n) => sum + n * f, 0)).toBeCloseTo(mean, 10);
  });

  it('has the counts that simulated shots have', () => {
    const random = generator(9, 9);
    const SHOTS = 20_000;
    const drawn: [Effect, number[]][] = [
      [
        { kind: 'neighbours', size: 0.3, mean: 3, trials: 12 },
        Array.from({ length: SHOTS }, () => chainCount(random, 12, 0.25, 0.3))
      ],
      [
        { kind: 'pairs', size: 0.1, mean: 3, trials: 12 },
        betaBinomial(random, SHOTS, 12, 0.25, 0.1).counts.flatMap(([n, h]) => new Array<number>(h).fill(n))
      ],
      [
        // Read share 0.25: true p = (0.25 − t)/(1 − 2t), t = 2·0.05·0.95.
        { kind: 'misread', size: 0.05, mean: 3, trials: 12 },
        Array.from({ length: SHOTS }, () => {
          const p = (0.25 - 0.095) / (1 - 0.19);
          let [spin, kinks] = [false, 0];
          let before = random.next() < 0.05;
          for (let bond = 0; bond < 12; bond++) {
            if (random.next() < p) spin = !spin;
            const read = random.next() < 0.05 ? !spin : spin;
            if (read !== before) kinks++;
            before = read;
          }
          return kinks;
        })
      ]
    ];
    for (const [effect, counts] of drawn) {
      const law = pmf(effect);
      const chi = law.reduce((sum, f, n) => {
        const seen = counts.filter((count) => count === n).length;
        return f * SHOTS < 5 ? sum : sum + (seen - f * SHOTS) ** 2 / (f * SHOTS);
      }, 0);
      // χ² with at most 12 degrees of freedom passes 32.9 once in 1000 (tables).
      expect(chi, effect.kind).toBeLessThan(32.9);
    }
  });
});

describe('dispersionSpread', () => {
  it('of equal trials is 2(1 − 1/N), of a Poisson law 2 with the lean 8 + 4/μ', () => {
    const binomial = dispersionSpread(equalCounts(3, 10), 10);
    expect(binomial.ratio).toBeCloseTo(1, 12);
    expect(binomial.spread).toBeCloseTo(1.8, 10);
    for (const mean of [0.1, 0.7, 5]) {
      const poisson = dispersionSpread(equalCounts(mean, null), null);
      expect(poisson.spread).toBeCloseTo(2, 10);
      // E C₂³/μ³ of the second Charlier polynomial (n − μ)² − n, by hand: 8 + 4/μ.
      expect(poisson.lean).toBeCloseTo(8 + 4 / mean, 8);
      expect(poisson.bias).toBeCloseTo(0, 10);
    }
  });
});
