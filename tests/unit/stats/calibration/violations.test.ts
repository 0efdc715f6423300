import { describe, expect, it } from 'vitest';
import { smallestExcess } from '$lib/stats/answer/smallest-excess';
import { violations } from '$lib/stats/calibration/violations';
import { generator } from '$lib/stats/random/generator';

const shots = 40_000;

/** Mean and variance that each cause implies, worked out here by hand, apart from the code that draws. */
const implied: Record<string, (strength: number) => [mean: number, variance: number]> = {
  // Var = N p(1−p)(1 + (N−1)ρ).
  'common-cause': (rho) => [9.6, 9.6 * 0.85 * (1 + 63 * rho)],
  'smallest-excess': (strength) => [9.6, 9.6 * 0.85 * (1 + strength * smallestExcess(9.6, 64, shots)!)],
  // Sites d apart are correlated by c^d: Var = p(1−p)[N + 2 Σ_d (N−d) c^d].
  neighbours: (c) => {
    let pairs = 0;
    for (let d = 1; d < 48; d++) pairs += (48 - d) * c ** d;
    return [4.8, 0.09 * (48 + 2 * pairs)];
  },
  // Mean of the two variances plus the variance of the two means.
  'two-settings': (shift) => {
    const binomial = (p: number) => 64 * p * (1 - p);
    return [9.6, (binomial(0.15 - shift) + binomial(0.15 + shift)) / 2 + (64 * shift) ** 2];
  },
  // In a burst each site is flipped with odds 0.1 + 0.9·0.3 = 0.37.
  bursts: (share) => mixture(share, [64 * 0.37, 64 * 0.37 * 0.63], [6.4, 6.4 * 0.9]),
  'dead-shots': (share) => mixture(share, [0, 0], [4.8, 4.8 * 0.88]),
  'pair-loss': (loss) => {
    // E and Var over n₀ ~ Bin(20, 0.15) of n₀ − 2·Bin(⌊n₀/2⌋, a).
    let [mean, square] = [0, 0];
    let f = 0.85 ** 20;
    for (let n = 0; n <= 20; n++) {
      const pairs = Math.floor(n / 2);
      const left = n - 2 * loss * pairs;
      mean += f * left;
      square += f * (left * left + 4 * pairs * loss * (1 - loss));
      f *= ((20 - n) / (n + 1)) * (0.15 / 0.85);
    }
    return [mean, square - mean * mean];
  },
  'ring-pairs': (clean) => {
    // Kinks 2m, m ~ Bin(20, 0.2); with odds (1 − clean)/2 one fewer, unless there are none.
    const missed = (1 - clean) / 2;
    const some = 1 - 0.8 ** 20;
    const mean = 8 - missed * some;
    // E n² = E[4m²] + missed·E[(1 − 4m); m > 0].
    return [mean, 4 * (16 + 3.2) + missed * (some - 4 * 4) - mean * mean];
  },
  drift: (rise) => {
    // p uniform on 0.15(1 ± d): variance of p is (0.15 d)²/3.
    const spread = (0.15 * rise) ** 2 / 3;
    return [9.6, 64 * (0.15 * 0.85 - spread) + 64 * 64 * spread];
  }
};

describe('the violations', () => {
  it('are each held below', () => {
    expect(violations.map(({ id }) => id).sort()).toEqual(Object.keys(implied).sort());
  });

  for (const { id, strengths, draw, trials } of violations) {
    it.each(strengths)(
      `${id} %s: mean and variance of its cause, within five standard errors`,
      (strength) => {
        const data = draw(generator(11, 4), shots, strength);
        const counts =
          data.kind === 'shots'
            ? Array.from(data.shots)
            : data.counts.flatMap(([n, seen]) => Array<number>(seen).fill(n));
        expect(counts.length).toBe(shots);
        expect(Math.max(...counts)).toBeLessThanOrEqual(trials);
        const mean = counts.reduce((sum, n) => sum + n, 0) / shots;
        const central = (power: number) => counts.reduce((sum, n) => sum + (n - mean) ** power, 0) / shots;
        const variance = central(2);
        const [expectedMean, expectedVariance] = implied[id](strength);
        expect(Math.abs(mean - expectedMean)).toBeLessThan(5 * Math.sqrt(variance / shots));
        expect(Math.abs(variance - expectedVariance)).toBeLessThan(
          5 * Math.sqrt((central(4) - variance ** 2) / shots)
        );
      }
    );
  }

  it('drift keeps the order, in ten batches', () => {
    const data = violations.find(({ id }) => id === 'drift')!.draw(generator(11, 5), 1000, 0.2);
    if (data.kind !== 'shots') throw new Error('no shot list');
    expect(data.batches!.slice(99, 101)).toEqual(['1', '2']);
    expect(new Set(data.batches).size).toBe(10);
  });
});

/** Mean and variance of a mixture of two laws. */
function mixture(share: number, a: [number, number], b: [number, number]): [number, number] {
  const mean = share * a[0] + (1 - share) * b[0];
  return [mean, share * a[1] + (1 - share) * b[1] + share * (1 - share) * (a[0] - b[0]) ** 2];
}
