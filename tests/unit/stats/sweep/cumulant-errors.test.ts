import { kStatistics } from '$lib/stats/moments/k-statistics';
import { cumulantErrors } from '$lib/stats/sweep/cumulant-errors';
import { describe, expect, it } from 'vitest';
import { drawn, landauZenerPmf } from './simulated';

describe('cumulantErrors', () => {
  it('agrees with the exact variances of k-statistics for many shots', () => {
    // Bin(12, ⅓) with 10^12 shots as expected: κ2 = Npq, κ3 = Npq(q − p), κ4 = Npq(1 − 6pq), and by the recursion
    // κ_{r+1} = p q dκ_r/dp further ones. Var and Cov: Kendall & Stuart, Advanced Theory of Statistics, ch. 12.
    const [N, p, q, S] = [12, 1 / 3, 2 / 3, 1e12];
    const choose = (n: number) => {
      let c = 1;
      for (let i = 0; i < n; i++) c = (c * (N - i)) / (i + 1);
      return c;
    };
    const counts = Array.from({ length: N + 1 }, (_, n): [number, number] => [
      n,
      Math.round(S * choose(n) * p ** n * q ** (N - n))
    ]);
    const v = N * p * q;
    const k = { 2: v, 3: v * (q - p), 4: v * (1 - 6 * p * q) } as const;
    const k5 = v * (q - p) * (1 - 12 * p * q);
    const k6 = v * (1 - 30 * p * q * (1 - 4 * p * q));
    const { covariance } = cumulantErrors(counts)!;
    const exact = [
      ...[k[2], k[3], k[4]],
      ...[k[3], k[4] + 2 * k[2] ** 2, k5 + 6 * k[2] * k[3]],
      ...[k[4], k5 + 6 * k[2] * k[3], k6 + 9 * (k[2] * k[4] + k[3] ** 2) + 6 * k[2] ** 3]
    ];
    covariance.forEach((value, i) => expect((value * S) / exact[i]).toBeCloseTo(1, 8));
  });

  it('is the scatter that repeats of the experiment show', () => {
    const law = landauZenerPmf(10);
    const repeats = Array.from({ length: 4000 }, (_, r) => kStatistics(drawn([law], 500, r)[0]));
    const told = drawn([law], 4_000_000, 9999).map((counts) => cumulantErrors(counts)!)[0];
    (['mean', 'variance', 'third'] as const).forEach((name, i) => {
      const values = repeats.map((one) => one[name]!);
      const mean = values.reduce((a, b) => a + b) / values.length;
      const spread = values.reduce((a, b) => a + (b - mean) ** 2, 0) / (values.length - 1);
      // The variance of 4000 values is known to √(2/4000) = 2.2 %; of third cumulants, which scatter with heavier tails,
      // less well: four standard errors are under 12 %.
      expect(spread / (told.covariance[4 * i] * (4_000_000 / 500))).toBeGreaterThan(0.88);
      expect(spread / (told.covariance[4 * i] * (4_000_000 / 500))).toBeLessThan(1.12);
    });
  });

  it('tells nothing where no error can be known', () => {
    expect(cumulantErrors([[3, 100]])).toBeNull();
    expect(
      cumulantErrors([
        [0, 5],
        [1, 5],
        [2, 1]
      ])
    ).toBeNull();
  });
});
