import { batchParts } from '$lib/stats/drift/batch-parts';
import { changePoint } from '$lib/stats/drift/change-point';
import { changeLimit } from '$lib/stats/drift/change-limit';
import { runningMean } from '$lib/stats/drift/running-mean';
import { equalSquaresLaw } from '$lib/stats/drift/squares-law';
import { withinBatches } from '$lib/stats/drift/within-batches';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { shuffle } from '$lib/stats/random/shuffle';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

function shotsOf(seed: number, rates: number[], each: number): { shots: number[]; names: string[] } {
  const random = generator(seed, 0);
  const shots: number[] = [];
  const names: string[] = [];
  rates.forEach((p, b) => {
    for (let i = 0; i < each; i++) {
      shots.push(binomialSample(random, 100, p));
      names.push(`batch ${b}`);
    }
  });
  return { shots, names };
}

describe('batchParts', () => {
  it('splits a small table as worked by hand', () => {
    // Batches 1, 3 and 4, 6, 8: means 2 and 6, sum of squares within 2 + 8 = 10, between 2·2.4² + 3·1.6² = 19.2.
    const found = batchParts([1, 3, 4, 6, 8], ['a', 'a', 'b', 'b', 'b'])!;
    expect(found.within).toBeCloseTo(10 / 3, 14);
    expect(found.ratio).toEqual({ value: expect.closeTo(5.76, 12) as number, between: 1, within: 3 });
    // n₀ = 5 − 13/5 = 2.4.
    expect(found.between).toBeCloseTo((19.2 - 10 / 3) / 2.4, 13);
    expect(found.total).toBeCloseTo(29.2 / 4, 14);
    expect(found.batches.map(({ variance }) => variance)).toEqual([2, 4]);
    expect(batchParts([1, 2], ['a', 'b'])).toBeNull();
    expect(batchParts([1, 2], ['a', 'a'])).toBeNull();
  });

  it('finds the drift that was put in, and none within: sd 0.01 of p = 0.1, 100 bonds', () => {
    const random = generator(8, 1);
    const rates = Array.from({ length: 200 }, () => 0.1 + 0.01 * Math.sqrt(12) * (random.next() - 0.5));
    const { shots, names } = shotsOf(8, rates, 100);
    const found = batchParts(shots, names)!;
    // τ = N·sd = 1, with the standard error of 200 batches of a uniform rate, about 0.08.
    expect(Math.abs(found.between - 1)).toBeLessThan(0.3);
    const within = withinBatches(found, equalSquaresLaw(100), 0.8, { resamples: 99, seed: 1 }).dispersion;
    expect(within.low!).toBeLessThan(1);
    expect(within.high!).toBeGreaterThan(0.99);
    // The published case: variance/ceiling = 1 + (N − 1)·Var(p)/(p(1 − p)) = 1.11 over all shots.
    expect(Math.abs(found.total / 9 - 1.11)).toBeLessThan(0.06);
  });
});

describe('runningMean', () => {
  it('marks the stretches that moved', () => {
    const { shots } = shotsOf(2, [...new Array<number>(14).fill(0.1), 0.15], 100);
    const points = runningMean(shots, 100);
    expect(points.filter(({ outside }) => outside).map(({ from }) => from)).toEqual([1400]);
    expect(points[3].mean).toBeCloseTo(shots.slice(300, 400).reduce((a, b) => a + b, 0) / 100, 12);
    expect(runningMean(shots, 1000)).toEqual([]);
    expect(runningMean([1, 2, 3, 4, 5], 2).map(({ from, to }) => [from, to])).toEqual([
      [0, 2],
      [2, 5]
    ]);
  });
});

describe('changePoint', () => {
  it('finds the change that was put in', async () => {
    const { shots } = shotsOf(4, [0.1, 0.1, 0.14], 60);
    const found = (await changePoint(shots, { resamples: 199, seed: 1 }))!;
    expect(Math.abs(found.at - 120)).toBeLessThanOrEqual(6);
    expect(found.p).toBe(1 / 200);
    expect(found.before).toBeCloseTo(shots.slice(0, found.at).reduce((a, b) => a + b, 0) / found.at, 12);
    expect(found.after).toBeCloseTo(shots.slice(found.at).reduce((a, b) => a + b, 0) / (180 - found.at), 12);
  });

  it('takes the cut of the greatest likelihood ratio, by trying each', async () => {
    const { shots } = shotsOf(6, [0.1], 40);
    const found = (await changePoint(shots, { resamples: 19, seed: 1 }))!;
    const gain = (k: number) => {
      const of = (part: number[]) => {
        const mean = part.reduce((a, b) => a + b, 0) / part.length;
        return part.reduce((a, b) => a + (b - mean) ** 2, 0);
      };
      return of(shots) - of(shots.slice(0, k)) - of(shots.slice(k));
    };
    const cuts = Array.from({ length: 31 }, (_, i) => i + 5);
    expect(gain(found.at)).toBeCloseTo(Math.max(...cuts.map(gain)), 9);
  });

  it('calls 5 % of steady lists, or nearly', async () => {
    let called = 0;
    for (let seed = 0; seed < 200; seed++) {
      const { shots } = shotsOf(seed + 100, [0.1], 60);
      if ((await changePoint(shots, { resamples: 99, seed }))!.p <= 0.05) called++;
    }
    // 10 expected; four standard errors are 12.
    expect(called).toBeLessThanOrEqual(22);
    expect(called).toBeGreaterThan(0);
    expect(await changePoint([1, 2, 3], { resamples: 19, seed: 1 })).toBeNull();
    expect(await changePoint(new Array<number>(30).fill(2), { resamples: 19, seed: 1 })).toBeNull();
  });

  it('for long lists takes the limit law, which permutations of 3000 shots bear out', async () => {
    // p of scores by 1999 permutations against the formula: at scores 6, 9, 12, with its margin of 5 in 3000.
    const { shots } = shotsOf(11, [0.1], 3000);
    const mean = shots.reduce((a, b) => a + b, 0) / shots.length;
    const values = Float64Array.from(shots, (n) => n - mean);
    const square = values.reduce((sum, d) => sum + d * d, 0);
    const scores: number[] = [];
    for (let b = 0; b < 1999; b++) {
      shuffle(generator(12, b), values);
      let sum = 0;
      let most = 0;
      for (let k = 1; k <= 2995; k++) {
        sum += values[k - 1];
        if (k >= 5) most = Math.max(most, (sum * sum * 3000) / (k * (3000 - k)));
      }
      scores.push((most * 3000) / square);
    }
    for (const score of [9, 12]) {
      const seen = scores.filter((one) => one >= score).length / scores.length;
      // The formula runs high for large chances: 0.107 for 0.09 or so, and close for small ones.
      expect(changeLimit(score, 5 / 3000)).toBeGreaterThan(seen - 3 * Math.sqrt(seen / 1999));
      expect(changeLimit(score, 5 / 3000)).toBeLessThan(1.5 * seen + 3 * Math.sqrt(seen / 1999));
    }
    const long = shotsOf(13, [0.1, 0.103], 12_000).shots;
    const found = (await changePoint(long, { resamples: 99, seed: 1 }))!;
    expect(found.source).toBe('limit');
    expect(found.p).toBeLessThan(1e-6);
    expect(Math.abs(found.at - 12_000)).toBeLessThan(2000);
  });
});
