import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { shotsOf } from '$lib/stats/calibration/shots-of';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';
import { equalHistograms } from '$lib/stats/versions/equal-histograms';
import { gStatistic } from '$lib/stats/versions/g-statistic';
import { describe, expect, it } from 'vitest';

const histogram = (shots: number[]): Histogram => ({
  kind: 'histogram',
  counts: shots.map((h, n): [number, number] => [n, h]).filter(([, h]) => h > 0),
  lump: null
});

/** Exact p of G over every way to deal the shots: each split of the shots, one by one, counted alike. */
function exact(a: number[], b: number[]): number {
  const shots = a.flatMap((h, n) => Array<number>(h + b[n]).fill(n));
  const size = a.reduce((sum, h) => sum + h, 0);
  const observed = gStatistic(a, b);
  let [reached, all] = [0, 0];
  for (let mask = 0; mask < 2 ** shots.length; mask++) {
    const rows = [a.map(() => 0), a.map(() => 0)];
    shots.forEach((n, i) => rows[(mask >> i) & 1][n]++);
    if (rows[0].reduce((sum, h) => sum + h, 0) !== size) continue;
    all++;
    if (gStatistic(rows[0], rows[1]) >= observed - 1e-9) reached++;
  }
  return reached / all;
}

const plain = (random: Generator, shots: number) => shotsOf(shots, () => binomialSample(random, 64, 0.15));

describe('equalHistograms', () => {
  it.each([
    [
      [3, 1, 2],
      [1, 4, 2]
    ],
    [
      [5, 2, 0, 0],
      [1, 2, 2, 1]
    ],
    [
      [6, 0],
      [2, 5]
    ]
  ])('shuffles as often beyond G as the exact count of all deals: %j and %j', (a, b) => {
    // 50 runs that stop at 100 exceedances each: standard error 1.5 % of p.
    let sum = 0;
    for (let seed = 0; seed < 50; seed++)
      sum += equalHistograms(histogram(a), histogram(b), { resamples: 20_000, seed }).p;
    expect(Math.abs(sum / 50 / exact(a, b) - 1)).toBeLessThan(0.06);
  });

  it('calls equal versions different as often as the level says', () => {
    let false5 = 0;
    for (let i = 0; i < 1000; i++) {
      const random = generator(21, i);
      const test = equalHistograms(plain(random, 300), plain(random, 500), { resamples: 199, seed: i });
      if (test.p <= 0.05) false5++;
    }
    // 50 expected, standard deviation 6.9.
    expect(false5).toBeGreaterThan(29);
    expect(false5).toBeLessThan(71);
  });

  it('sees crosstalk that a quarter of the ceiling adds, at 5000 shots', () => {
    let seen = 0;
    for (let i = 0; i < 20; i++) {
      const random = generator(22, i);
      const crossed = betaBinomial(random, 5000, 64, 0.15, 0.004);
      if (equalHistograms(plain(random, 5000), crossed, { resamples: 199, seed: i }).p <= 0.05) seen++;
    }
    expect(seen).toBeGreaterThanOrEqual(18);
  });

  it('says the same for the same seed, 1 for one count alone, and refuses a version without shots', () => {
    const [a, b] = [histogram([30, 20, 5]), histogram([20, 30, 9])];
    const options = { resamples: 999, seed: 4 };
    expect(equalHistograms(a, b, options)).toEqual(equalHistograms(a, b, options));
    expect(equalHistograms(histogram([9]), histogram([4]), options)).toMatchObject({
      statistic: 0,
      freedom: 0,
      p: 1
    });
    expect(() => equalHistograms(a, histogram([]), options)).toThrow('without shots');
  });
});
