import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { chiSquareScore, lawByRatios } from './chi-square';

/** Draws grouped into the support within nine standard deviations; outside it, the ends. */
function score(n: number, p: number, draws: number, stream: number): number {
  const spread = Math.sqrt(n * p * (1 - p));
  const mode = Math.min(n, Math.floor((n + 1) * p));
  const from = Math.max(0, Math.floor(mode - 9 * spread - 20));
  const to = Math.min(n, Math.ceil(mode + 9 * spread + 20));
  const pmf = lawByRatios(from, mode, to, (k) => (((n - k) / (k + 1)) * p) / (1 - p));
  const seen = new Float64Array(to - from + 1);
  const source = generator(2024, stream);
  for (let i = 0; i < draws; i++) seen[Math.min(to, Math.max(from, binomialSample(source, n, p))) - from]++;
  return chiSquareScore(seen, pmf);
}

describe('binomialSample', () => {
  const grid: [number, number][] = [];
  for (const mean of [0.1, 5, 9.9, 10.1, 50, 1e3, 1e6]) {
    for (const n of [12, 20, 25, 64, 1000, 26306, 1e7, 2 ** 40]) {
      if (mean <= n / 2) grid.push([n, mean / n], [n, 1 - mean / n]);
    }
  }
  grid.push([1, 0.3], [2, 0.5], [12, 0.3376986], [40, 0.5], [2000, 0.5], [2 ** 40, 0.3]);

  it.each(grid)('follows Bin(%d, %d)', (n, p) => {
    expect(Math.abs(score(n, p, 100_000, Math.round(n * p) % 2 ** 40))).toBeLessThan(4);
  });

  it('follows the normal law at n = 2^53 − 1, where no cell can be counted', () => {
    const n = Number.MAX_SAFE_INTEGER;
    const source = generator(5, 0);
    for (const p of [0.3, 0.5, 0.9]) {
      const seen = new Float64Array(10);
      // Deciles of the standard normal law, from printed tables (from memory).
      const deciles = [-1.2815516, -0.8416212, -0.5244005, -0.2533471, 0, 0.2533471, 0.5244005, 0.8416212];
      deciles.push(1.2815516);
      for (let i = 0; i < 50_000; i++) {
        const k = binomialSample(source, n, p);
        if (!Number.isSafeInteger(k) || k < 0) throw new Error(`not a count: ${k}`);
        const z = (k - n * p) / Math.sqrt(n * p * (1 - p));
        seen[deciles.filter((decile) => z > decile).length]++;
      }
      expect(Math.abs(chiSquareScore(seen, new Float64Array(10).fill(0.1)))).toBeLessThan(4);
    }
  });

  it('has sure outcomes', () => {
    const source = generator(1, 1);
    expect(binomialSample(source, 0, 0.4)).toBe(0);
    expect(binomialSample(source, 17, 0)).toBe(0);
    expect(binomialSample(source, 17, 1)).toBe(17);
    expect(binomialSample(source, 2 ** 52, 5e-324)).toBe(0);
    expect(binomialSample(source, Number.MAX_SAFE_INTEGER, 1)).toBe(Number.MAX_SAFE_INTEGER);
  });

  it('refuses what is no binomial law', () => {
    const source = generator(1, 1);
    for (const n of [-1, 1.5, NaN, 2 ** 53]) expect(() => binomialSample(source, n, 0.5)).toThrow(RangeError);
    for (const p of [-0.1, 1.1, NaN]) expect(() => binomialSample(source, 5, p)).toThrow(RangeError);
  });
});
