import { batchIndex } from '$lib/stats/order/batch-index';
import { batchesTest } from '$lib/stats/order/batches-test';
import { betweenBatches } from '$lib/stats/order/between-batches';
import { generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';
import { describe, expect, it } from 'vitest';
import { meanAndVariance, orders } from './orders';

const options = { resamples: 1999, seed: 1 };
async function run(shots: number[], batches: string[], resamples = 1999, seed = 1) {
  const outcome = await batchesTest(shots, batches, { resamples, seed });
  if (!outcome.ok) throw new Error(outcome.reason);
  return outcome;
}

describe('batchesTest', () => {
  it('has the between-groups sum of squares of insect counts under six sprays', async () => {
    // Beall 1942, Biometrika 32:243, as R 4.2.2 data set InsectSprays; summary(aov(count ~ spray)): 2668.8333.
    const counts = [
      10, 7, 20, 14, 14, 12, 10, 23, 17, 20, 14, 13, 11, 17, 21, 11, 16, 14, 17, 17, 19, 21, 7, 13, 0, 1, 7,
      2, 3, 1, 2, 1, 3, 0, 1, 4, 3, 5, 12, 6, 4, 3, 5, 5, 5, 5, 2, 4, 3, 5, 3, 5, 3, 6, 1, 1, 3, 2, 6, 4, 11,
      9, 15, 22, 15, 16, 13, 10, 26, 26, 24, 13
    ];
    const result = await run(
      counts,
      counts.map((_, i) => 'ABCDEF'[Math.floor(i / 12)])
    );
    expect(result.statistic).toBeCloseTo(2668.83333333, 7);
    // F = 34.7 on 5 and 66 degrees of freedom, p < 2e-16: no permutation can reach it.
    expect(result.p).toBe(result.smallestP);
    expect([result.source, result.resamples, result.stoppedEarly]).toEqual(['permuted', 1999, false]);
  });

  it('has the p-value of all 5040 orders', async () => {
    const shots = [4, 3, 5, 1, 0, 1, 2];
    const batches = ['a', 'a', 'a', 'b', 'b', 'c', 'c'];
    const index = batchIndex(batches);
    const { mean } = meanAndVariance(shots);
    const statistic = (order: number[]) =>
      betweenBatches(
        Float64Array.from(order, (n) => n - mean),
        index
      );
    const observed = statistic(shots);
    const all = orders(shots);
    const exact = all.filter((order) => statistic(order) >= observed - 1e-9).length / all.length;
    // Each stopped p has a relative error of √((1 − p)/100) and a bias of p/100.
    let sum = 0;
    for (let seed = 0; seed < 40; seed++) sum += (await run(shots, batches, 40_000, seed)).p;
    expect(Math.abs(sum / 40 - exact)).toBeLessThan(exact * (0.01 + 4 * Math.sqrt((1 - exact) / 4000)));
  });

  it('keeps 5 % when batches mean nothing, and finds a batch that differs', async () => {
    const source = generator(20, 0);
    let alarms = 0;
    const runs = 400;
    for (let i = 0; i < runs; i++) {
      const shots = Array.from({ length: 60 }, () => poissonSample(source, 0.7));
      const batches = shots.map((_, j) => `batch ${Math.floor(j / 13)}`);
      if ((await run(shots, batches, 199)).p <= 0.05) alarms++;
    }
    // 5 % of 400 is 20, standard deviation 4.4.
    expect(alarms).toBeGreaterThan(20 - 3 * 4.4);
    expect(alarms).toBeLessThan(20 + 3 * 4.4);
    const drifting = Array.from({ length: 600 }, (_, i) => poissonSample(source, i < 200 ? 2.8 : 2));
    expect(
      (
        await run(
          drifting,
          drifting.map((_, i) => `${Math.floor(i / 100)}`)
        )
      ).p
    ).toBeLessThan(0.01);
  });

  it('goes to the limit law on long lists, and it agrees with permutations', async () => {
    const source = generator(21, 0);
    const shots = Array.from({ length: 20_001 }, (_, i) =>
      poissonSample(source, 1.5 + 0.02 * Math.floor(i / 7000))
    );
    const batches = shots.map((_, i) => `${Math.floor(i / 3000)}`);
    const limit = await run(shots, batches);
    const permuted = await run(shots.slice(0, 20_000), batches.slice(0, 20_000));
    expect([limit.source, permuted.source]).toEqual(['limit', 'permuted']);
    expect(Math.abs(limit.p - permuted.p)).toBeLessThan(4 * Math.sqrt(limit.p / 1999) + 0.01);
  });

  it('permutes long lists where one shot decides', async () => {
    const shots = Array.from({ length: 20_001 }, (_, i) => (i === 17 ? 40 : i % 500 === 0 ? 1 : 0));
    const { source } = await run(
      shots,
      shots.map((_, i) => (i < 100 ? 'first' : 'rest')),
      99
    );
    expect(source).toBe('permuted');
  });

  it('says why it cannot run', async () => {
    const reason = async (shots: number[], batches: string[]) => {
      const outcome = await batchesTest(shots, batches, options);
      return outcome.ok ? null : outcome.reason;
    };
    expect(await reason([1, 2, 3], ['a', 'a', 'a'])).toBe('All shots belong to one batch.');
    expect(await reason([1, 2, 3], ['a', 'b', 'c'])).toBe('Every batch has one shot only.');
    expect(await reason([2, 2, 2], ['a', 'b', 'b'])).toBe('All shots have the same count.');
    expect(await reason([], [])).toBe('All shots belong to one batch.');
    await expect(batchesTest([1, 2], ['a'], options)).rejects.toThrow(RangeError);
  });
});
