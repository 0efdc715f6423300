import { generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';
import { describe, expect, it } from 'vitest';
import { chiSquareScore, lawByRatios } from './chi-square';

describe('poissonSample', () => {
  it.each([0.01, 0.5, 3.87, 9.9, 10, 11.6, 14.05, 33.25, 50, 1e3, 1e6, 1e10])(
    'follows Poisson(%d)',
    (mean) => {
      const mode = Math.floor(mean);
      const from = Math.max(0, Math.floor(mean - 9 * Math.sqrt(mean) - 20));
      const to = Math.ceil(mean + 9 * Math.sqrt(mean) + 20);
      const pmf = lawByRatios(from, mode, to, (k) => mean / (k + 1));
      const seen = new Float64Array(to - from + 1);
      const source = generator(31, mode);
      for (let i = 0; i < 200_000; i++)
        seen[Math.min(to, Math.max(from, poissonSample(source, mean))) - from]++;
      expect(Math.abs(chiSquareScore(seen, pmf))).toBeLessThan(4);
    }
  );

  it('follows the normal law at a mean of 2^52', () => {
    const mean = 2 ** 52;
    const source = generator(6, 0);
    let [sum, square] = [0, 0];
    const draws = 50_000;
    for (let i = 0; i < draws; i++) {
      const z = (poissonSample(source, mean) - mean) / Math.sqrt(mean);
      sum += z;
      square += z * z;
    }
    expect(Math.abs(sum) / Math.sqrt(draws)).toBeLessThan(4);
    expect(Math.abs(square - draws) / Math.sqrt(2 * draws)).toBeLessThan(4);
  });

  it('gives 0 for mean 0 and refuses what is no mean', () => {
    const source = generator(1, 1);
    expect(poissonSample(source, 0)).toBe(0);
    for (const mean of [-1, NaN, Infinity, 2 ** 53]) {
      expect(() => poissonSample(source, mean)).toThrow(RangeError);
    }
  });
});
