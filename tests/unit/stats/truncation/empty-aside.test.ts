import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { fitData } from '$lib/stats/fit/fit-data';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { unbroken } from '$lib/stats/resampling/pace';
import { emptyAside } from '$lib/stats/truncation/empty-aside';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { highest } from '../calibration/binomial-limits';

const equal = (random: Generator) => binomialSample(random, 20, 0.15);
const bunched = (random: Generator) => binomialSample(random, 20, betaSample(random, 0.15 * 24, 0.85 * 24));

/** Shots of which one in eight is dead. */
function made(seed: number, draw: (random: Generator) => number, shots = 3000): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let i = 0; i < shots; i++) {
    const n = random.next() < 0.125 ? 0 : draw(random);
    seen.set(n, (seen.get(n) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

const of = async (seed: number, draw: (random: Generator) => number, alpha = 0.05) =>
  (await emptyAside(
    fitData(made(seed, draw), 20),
    { ...defaultOptions, seed, alpha, resamples: 99 },
    unbroken
  ))!;

describe('empty shots set aside', () => {
  it('leaves every test of the rest at its level where only dead shots were put in, and limits that hold 1', async () => {
    const repeats = 100;
    const alarms = new Map<string, number>();
    let against = 0;
    let held = 0;
    for (let seed = 1; seed <= repeats; seed++) {
      const found = await of(seed, equal);
      for (const { id, p } of found.tests) alarms.set(id, (alarms.get(id) ?? 0) + (p <= 0.05 ? 1 : 0));
      if (found.verdict === 'excess' || found.verdict === 'misfit') against++;
      if (found.dispersion.low! <= 1 && 1 <= found.dispersion.high!) held++;
    }
    expect([...alarms.keys()]).toEqual(['ceiling', 'fit', 'high-tail', 'low-tail']);
    for (const [id, hits] of alarms) expect(hits, id).toBeLessThanOrEqual(highest(repeats, 0.07));
    expect([...alarms.values()].reduce((sum, hits) => sum + hits)).toBeGreaterThan(0);
    expect(against).toBeLessThanOrEqual(highest(repeats, 0.05));
    expect(held / repeats).toBeGreaterThan(0.89);
  }, 120_000);

  it('still sees bunching among the rest: ρ = 0.04', async () => {
    let seen = 0;
    for (let seed = 1; seed <= 20; seed++) if ((await of(seed, bunched)).verdict === 'excess') seen++;
    expect(seen).toBeGreaterThanOrEqual(16);
  });

  it('sees a rest that interacts though its variance keeps the ceiling: no more than five fit in', async () => {
    const blocked = (random: Generator) => Math.min(5, equal(random));
    for (let seed = 1; seed <= 10; seed++) {
      const found = await of(seed, blocked);
      expect(found.dispersion.high).toBeLessThan(1);
      expect(found.verdict).toBe('misfit');
      expect(found.statement).toMatch(/do not fit such trials/);
    }
  });

  it('asks the same of the rest as a diagnosis of counts of which 1 and more are said to be kept', async () => {
    const histogram = made(5, equal);
    const rest = { ...histogram, counts: histogram.counts.filter(([count]) => count > 0) };
    const options = { ...defaultOptions, trials: 20, seed: 5, resamples: 199 };
    const aside = (await emptyAside(fitData(histogram, 20), options, unbroken))!;
    const cut = await diagnose(rest, { ...options, kept: { from: 1, to: null } });
    expect(aside.ceiling).toBe(cut.moments.ceiling);
    for (const { id, statistic, p } of aside.tests) {
      const same = cut.tests.find((test) => test.id === id)!;
      expect(statistic, id).toBe(same.statistic);
      expect(p, id).toBe(same.p);
    }
  });

  it('is not asked where the cut leaves two counts, whose mean fixes their shape', async () => {
    const two: Histogram = {
      kind: 'histogram',
      counts: [
        [0, 900],
        [1, 60],
        [2, 40]
      ],
      lump: null
    };
    expect(await emptyAside(fitData(two, 2), { ...defaultOptions, trials: 2 }, unbroken)).toBeNull();
  });

  it('cannot be judged, rather than be compatible, with resamples too few for its level', async () => {
    const found = await of(1, (random) => Math.min(5, equal(random)), 0.01);
    expect(found.verdict).toBe('undecided');
    expect(found.statement).toMatch(/so few resamples/);
  });

  it('stands in the document where dead shots are flagged', async () => {
    const found = await diagnose(made(3, equal, 12_000), { ...defaultOptions, trials: 20, resamples: 999 });
    expect(found.flags.map(({ id }) => id)).toContain('dead-shots');
    expect(found.nuisances!.emptyAside).toMatchObject({ verdict: 'compatible' });
    expect(found.nuisances!.emptyAside!.statement).toMatch(/the rest keeps it, and is compatible/);
  });
});
