import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { ceilingTest } from '$lib/stats/resampling/ceiling-test';
import { unbroken } from '$lib/stats/resampling/pace';
import { describe, expect, it } from 'vitest';
import { dataOf, plainPmf } from '../fit/plain';
import { excessOverUniform, shortfallUnderUniform } from './kolmogorov';

const options = { resamples: 999, seed: 3 };

describe('ceilingTest', () => {
  it('has s² − μ̂(1 − μ̂/N) as its statistic, s² unbiased', async () => {
    // Counts 0, 0, 2, 2 of N = 4: mean 1, s² = 4/3, ceiling 3/4.
    const data = dataOf({ shots: [2, 0, 2], trials: 4 });
    expect((await ceilingTest(data, 0.25, options, unbroken)).statistic).toBeCloseTo(4 / 3 - 3 / 4, 12);
    const unknown = dataOf({ shots: [2, 0, 2], trials: null });
    expect((await ceilingTest(unknown, 1, options, unbroken)).statistic).toBeCloseTo(4 / 3 - 1, 12);
  });

  it('agrees with an enumeration of every histogram of four shots', async () => {
    // N = 2, p = ½, counts 0, 0, 2, 2. All 3^4 outcomes of four shots, each with its probability.
    const f = [0.25, 0.5, 0.25];
    const excess = (counts: number[]) => {
      const mean = counts.reduce((a, b) => a + b) / 4;
      return counts.reduce((sum, n) => sum + (n - mean) ** 2, 0) / 3 - mean * (1 - mean / 2);
    };
    const seen = excess([0, 0, 2, 2]);
    let exact = 0;
    for (let code = 0; code < 81; code++) {
      const counts = [code % 3, Math.floor(code / 3) % 3, Math.floor(code / 9) % 3, Math.floor(code / 27)];
      if (excess(counts) >= seen - 1e-12) exact += counts.reduce((product, n) => product * f[n], 1);
    }
    const { p } = await ceilingTest(
      dataOf({ shots: [2, 0, 2], trials: 2 }),
      0.5,
      { resamples: 20_000, seed: 1 },
      unbroken
    );
    // Ended at 100 exceedances: a standard error of a tenth of p.
    expect(Math.abs(p / exact - 1)).toBeLessThan(0.35);
  });

  it('gives uniform p-values under equal trials', async () => {
    const truth = histogramSampler(binomialWindow(12, 0.3, 1e-20, 1).values);
    const p: number[] = [];
    for (let repeat = 0; repeat < 300; repeat++) {
      const into = new Float64Array(13);
      truth.draw(generator(99, repeat), 400, into);
      const data = dataOf({ shots: [...into], trials: 12 });
      const mean = into.reduce((sum, h, n) => sum + h * n, 0) / 400;
      const test = await ceilingTest(data, mean / 12, { resamples: 199, seed: repeat }, unbroken);
      p.push(test.p);
    }
    expect(excessOverUniform(p)).toBeLessThan(1.63);
    expect(shortfallUnderUniform(p)).toBeLessThan(1.63);
  });

  it('is small for counts twice as dispersed, and large for regular ones', async () => {
    const [a, b] = [plainPmf(new Array<number>(12).fill(0.15)), plainPmf(new Array<number>(12).fill(0.45))];
    const bunched = dataOf({ shots: a.map((f, n) => Math.round(500 * (f + b[n]))), trials: 12 });
    const found = await ceilingTest(bunched, 0.3, options, unbroken);
    expect(found).toMatchObject({ id: 'ceiling', source: 'resampled', p: 1 / 1000, smallestP: 1 / 1000 });
    expect(found).toMatchObject({ resamples: 999, stoppedEarly: false });
    const regular = dataOf({ shots: [0, 100, 800, 100], trials: 12 });
    const other = await ceilingTest(regular, 2 / 12, options, unbroken);
    expect(other).toMatchObject({ p: 1, resamples: 100, stoppedEarly: true });
  });
});
