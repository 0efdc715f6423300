import { kStatistics } from '$lib/stats/moments/k-statistics';
import { describe, expect, it } from 'vitest';
import reference from '../../../../fixtures/reference/k-statistics.json';

describe('kStatistics', () => {
  it.each(reference)('agrees with exact rational arithmetic: $name', ({ counts, ...expected }) => {
    const found = kStatistics(counts as [number, number][]);
    for (const key of ['mean', 'variance', 'third', 'fourth'] as const) {
      const value = expected[key];
      if (value === null) expect(found[key]).toBeNull();
      else expect(Math.abs(found[key]! - value)).toBeLessThanOrEqual(1e-15 * Math.abs(value));
    }
  });

  it('gives the published moments of Rutherford and Geiger’s counts', () => {
    // Rutherford & Geiger 1910, Phil. Mag. 20:698; moments as in science.md 11.
    const counts = [57, 203, 383, 525, 532, 408, 273, 139, 45, 27, 10, 4, 0, 1, 1].map(
      (h, n) => [n, h] as const
    );
    const { shots, mean, variance } = kStatistics(counts);
    expect(shots).toBe(2608);
    expect(mean).toBeCloseTo(3.871549, 6);
    expect(variance).toBeCloseTo(3.696191, 6);
  });

  it('is unbiased: averages over all samples of four from a small law', () => {
    // Bernoulli(0.3): κ = p, pq, pq(1−2p), pq(1−6pq).
    const [p, q] = [0.3, 0.7];
    const sums = [0, 0, 0, 0];
    for (const [ones, ways] of [
      [0, 1],
      [1, 4],
      [2, 6],
      [3, 4],
      [4, 1]
    ]) {
      const k = kStatistics([
        [0, 4 - ones],
        [1, ones]
      ]);
      const weight = ways * p ** ones * q ** (4 - ones);
      [k.mean, k.variance!, k.third!, k.fourth!].forEach((value, i) => (sums[i] += weight * value));
    }
    [p, p * q, p * q * (q - p), p * q * (1 - 6 * p * q)].forEach((kappa, i) =>
      expect(sums[i]).toBeCloseTo(kappa, 14)
    );
  });

  it('refuses an empty histogram and fractions', () => {
    expect(() => kStatistics([])).toThrow(RangeError);
    expect(() => kStatistics([[3, 0]])).toThrow(RangeError);
    expect(() => kStatistics([[3, -1]])).toThrow(RangeError);
    expect(() => kStatistics([[3, NaN]])).toThrow(RangeError);
    expect(() => kStatistics([[0.5, 2]])).toThrow(RangeError);
  });
});
