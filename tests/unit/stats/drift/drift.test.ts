import { batchParts } from '$lib/stats/drift/batch-parts';
import { changePoint } from '$lib/stats/drift/change-point';
import { excessWithin } from '$lib/stats/drift/excess-within';
import { runningMean } from '$lib/stats/drift/running-mean';
import { binomialSample } from '$lib/stats/random/binomial-sample';
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
    const within = excessWithin(found, 100);
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
});
