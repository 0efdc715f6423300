import { bestLaw } from '$lib/stats/fit/best-law';
import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { fittedTests, type FittedTests } from '$lib/stats/resampling/fitted-tests';
import { unbroken } from '$lib/stats/resampling/pace';
import { beforeAll, describe, expect, it } from 'vitest';
import { dataOf, plainPmf, type Problem } from '../fit/plain';
import { excessOverUniform } from './kolmogorov';

function run(problem: Problem, resamples: number, seed: number): Promise<FittedTests> {
  const data = dataOf(problem);
  return fittedTests(data, bestLaw(data), { resamples, seed }, unbroken);
}

describe('fittedTests under equal trials', () => {
  const p = new Map<string, number[]>();

  beforeAll(async () => {
    const truth = histogramSampler(binomialWindow(12, 0.3, 1e-20, 1).values);
    for (let repeat = 0; repeat < 120; repeat++) {
      const into = new Float64Array(13);
      truth.draw(generator(7, repeat), 600, into);
      const { tests } = await run({ shots: [...into], trials: 12 }, 99, repeat);
      for (const test of tests) p.set(test.id, [...(p.get(test.id) ?? []), test.p]);
    }
  }, 120_000);

  it('gives p-values that are not small more often than they say', () => {
    for (const id of ['fit', 'high-tail', 'low-tail', 'parity', 'empty-shots']) {
      expect(p.get(id)!.length, id).toBeGreaterThan(110);
      // The plug-in law fits the data a little too well, never too badly: 1.63 is the 0.5 % point of exact tests.
      expect(excessOverUniform(p.get(id)!), id).toBeLessThan(1.63);
    }
  });

  it('gives small ones too: the tests are not asleep', () => {
    for (const id of ['fit', 'high-tail', 'low-tail', 'parity']) {
      const small = p.get(id)!.filter((value) => value <= 0.25).length;
      // A quarter of 120 expected; 12 lies 3.8 standard deviations below.
      expect(small, id).toBeGreaterThan(12);
    }
  });
});

describe('fittedTests', () => {
  const shots = plainPmf(new Array<number>(12).fill(0.3)).map((f) => Math.round(3000 * f));
  const find = ({ tests }: FittedTests, id: string) => tests.find((test) => test.id === id)!;

  it('sees a burst in the high tail alone', async () => {
    const burst = [...shots];
    for (const n of [10, 11, 12]) burst[n] += 6;
    const found = await run({ shots: burst, trials: 12 }, 199, 1);
    expect(find(found, 'high-tail').p).toBe(1 / 200);
    expect(find(found, 'low-tail').p).toBeGreaterThan(0.05);
  });

  it('sees one parity preferred', async () => {
    const even = shots.map((h, n) => Math.round(h * (n % 2 === 0 ? 1.15 : 0.85)));
    expect(find(await run({ shots: even, trials: 12 }, 199, 1), 'parity').p).toBe(1 / 200);
  });

  it('sees too many empty shots', async () => {
    const dead = [...shots];
    dead[0] += 80;
    const found = await run({ shots: dead, trials: 12 }, 199, 1);
    expect(find(found, 'empty-shots').p).toBe(1 / 200);
    expect(found.expectedEmpty).toBeCloseTo(3000 * 0.7 ** 12, -1);
    expect(found.lowTailOfTheRest).toBeGreaterThan(0.05);
  });

  it('depends on the seed, and on nothing else', async () => {
    const once = await run({ shots, trials: 12 }, 60, 5);
    expect(await run({ shots, trials: 12 }, 60, 5)).toEqual(once);
    expect((await run({ shots, trials: 12 }, 60, 6)).nullDivergences).not.toEqual(once.nullDivergences);
  });

  it('draws no more than asked, and the first draws do not depend on how many are asked', async () => {
    const few = await run({ shots, trials: 12 }, 30, 5);
    const more = await run({ shots, trials: 12 }, 90, 5);
    expect(few.nullDivergences).toHaveLength(30);
    expect(more.nullDivergences.slice(0, 30)).toEqual(few.nullDivergences);
  });

  it('stops each test at 100 exceedances', async () => {
    const { tests } = await run({ shots, trials: 12 }, 1999, 2);
    for (const test of tests) {
      // The expected histogram itself is as typical as can be.
      expect(test.stoppedEarly, test.id).toBe(true);
      expect(test.p, test.id).toBeGreaterThan(0.1);
      expect(test.p, test.id).toBeCloseTo(100 / test.resamples, 12);
      expect(test.smallestP).toBe(1 / 2000);
    }
  });

  it('runs nothing where every shot had the same count', async () => {
    const found = await run({ shots: [0, 0, 40], trials: 5 }, 99, 1);
    expect(found).toMatchObject({ tests: [], nullDivergences: [], lowTailOfTheRest: null });
    expect(found.notRun.map(({ id }) => id)).toEqual([
      'fit',
      'high-tail',
      'low-tail',
      'parity',
      'empty-shots'
    ]);
  });
});
