import { centralTail } from '$lib/stats/numerics/central-tail';
import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import { describe, expect, it } from 'vitest';

/** Second algorithm: the plain sum outward from k. */
function sumUp(k: number, last: number, pmf: (j: number) => number): number {
  let sum = 0;
  for (let j = k; j <= last; j++) sum += Math.exp(pmf(j));
  return sum;
}

describe('centralTail', () => {
  it.each([
    [4096, 0.5],
    [5000, 0.3],
    [12000, 0.1],
    [12000, 0.9],
    [200000, 0.006]
  ])('agrees with the sum of a binomial pmf, n = %d, p = %d', (n, p) => {
    const q = 1 - p;
    const variance = n * p * q;
    const sigma = Math.sqrt(variance);
    for (const z of [-0.5, 0, 0.3, 1, 1.5, 2.4]) {
      const k = Math.round(n * p + z * sigma);
      const want = sumUp(k, Math.min(n, Math.round(k + 12 * sigma)), (j) => logBinomialPmf(j, n, p));
      expect(centralTail(k - n * p, variance, q - p, p * q) / want).toBeCloseTo(1, 11);
    }
  });

  it('agrees with the sum of a Poisson pmf, and its lower tail with the rest', () => {
    const mean = 1234.5;
    for (const k of [1220, 1235, 1270, 1300]) {
      const want = sumUp(k, 1900, (j) => logPoissonPmf(j, mean));
      expect(centralTail(k - mean, mean, 1, 0) / want).toBeCloseTo(1, 11);
      expect(centralTail(mean - (k - 1), mean, -1, 0) / (1 - want)).toBeCloseTo(1, 10);
    }
  });

  it('tends to the normal tail with Edgeworth’s first term as the variance grows', () => {
    // At the mean of a symmetric law: ½ + ½ of the central probability.
    const variance = 1e18;
    expect(centralTail(0, variance, 0, 0.25)).toBeCloseTo(0.5 + 0.5 / Math.sqrt(2 * Math.PI * variance), 15);
  });
});
