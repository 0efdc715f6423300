import { driftReport } from '$lib/stats/drift/drift-report';
import type { DriftPart } from '$lib/stats/drift/types';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { chainWindow } from '$lib/stats/misread/chain-window';
import { misreadCeiling } from '$lib/stats/misread/misread-ceiling';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import { equalWindow } from '$lib/stats/resampling/ceiling-test';
import { unbroken } from '$lib/stats/resampling/pace';
import type { ShotList } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

interface Made {
  batches: number;
  each: number;
  trials: number;
  p: number;
  /** Standard deviation of p between batches, uniform. */
  drift: number;
  /** Correlation within a shot (beta-binomial); 0 for independent trials. */
  rho: number;
}

function made(seed: number, { batches, each, trials, p, drift, rho }: Made): ShotList {
  const random = generator(seed, 0);
  const shots: number[] = [];
  const names: string[] = [];
  for (let b = 0; b < batches; b++) {
    const here = p + drift * Math.sqrt(12) * (random.next() - 0.5);
    for (let i = 0; i < each; i++) {
      const q = rho === 0 ? here : betaSample(random, here * (1 / rho - 1), (1 - here) * (1 / rho - 1));
      shots.push(binomialSample(random, trials, q));
      names.push(`run ${b}`);
    }
  }
  return { kind: 'shots', shots, batches: names };
}

async function report(list: ShotList, trials: number | null, seed = 1): Promise<DriftPart> {
  const size = list.shots.length;
  const mean = Array.from(list.shots).reduce((a, b) => a + b, 0) / size;
  const variance = Array.from(list.shots).reduce((a, n) => a + (n - mean) ** 2, 0) / (size - 1);
  const { window, ceiling } = equalWindow(trials, trials === null ? mean : mean / trials);
  const interval = (value: number) => ({ value, low: null, high: null });
  const part = await driftReport(
    list,
    trials,
    { mean: interval(mean), variance: interval(variance), ceiling: ceiling(mean) },
    { ceiling: null, mostDispersed: { window, ceiling } },
    { ...defaultOptions, trials, resamples: 19, seed },
    true,
    unbroken
  );
  return part!;
}

const repeats = 200;
async function share(of: Made, trials: number | null, counts: (part: DriftPart) => boolean): Promise<number> {
  let hits = 0;
  for (let seed = 0; seed < repeats; seed++) if (counts(await report(made(seed + 1, of), trials))) hits++;
  return hits / repeats;
}

describe('batches one by one and pooled', () => {
  // Drift is put in everywhere: the test within batches must not feel it. 5 % of 200, four standard errors: 0.112.
  it.each<[string, Made, number | null]>([
    ['100 bonds', { batches: 10, each: 50, trials: 100, p: 0.1, drift: 0.02, rho: 0 }, 100],
    ['few shots a batch', { batches: 60, each: 4, trials: 40, p: 0.2, drift: 0.05, rho: 0 }, 40],
    ['rare defects, strewn', { batches: 4, each: 100, trials: 10, p: 0.01, drift: 0.004, rho: 0 }, 10],
    ['nearly full', { batches: 6, each: 60, trials: 8, p: 0.9, drift: 0.03, rho: 0 }, 8],
    ['N unknown', { batches: 8, each: 40, trials: 100_000, p: 3e-5, drift: 1e-5, rho: 0 }, null]
  ])('calls about 5 % of independent trials at 5 %%: %s', async (_name, of, trials) => {
    const called = await share(of, trials, ({ split }) => split!.p! <= 0.05);
    const both = await share(of, trials, ({ split }) => split!.pTogether! <= 0.05);
    expect(called).toBeLessThanOrEqual(0.112);
    expect(both).toBeLessThanOrEqual(0.112);
    // Lumpy sums call less, and never nothing.
    expect(called).toBeGreaterThan(0);
  });

  it('assigns the excess of drifting batches to drift, and calls them compatible within', async () => {
    // sd 0.02 of p = 0.1, 100 bonds: an excess of 99·0.02²/0.09 = 0.44 of the ceiling; 4000 shots.
    const of = { batches: 20, each: 200, trials: 100, p: 0.1, drift: 0.02, rho: 0 };
    const seen: string[] = [];
    let between = 0;
    for (let seed = 0; seed < 60; seed++) {
      const { split } = await report(made(seed + 500, of), 100);
      seen.push(split!.verdict);
      between += split!.excessBetween / split!.excess / 60;
      expect(split!.excessBetween + split!.excessWithin.value!).toBeCloseTo(split!.excess, 10);
    }
    expect(seen.filter((verdict) => verdict === 'compatible').length).toBeGreaterThanOrEqual(57);
    expect(Math.abs(between - 1)).toBeLessThan(0.05);
  });

  it('still sees an excess within batches beneath the same drift', async () => {
    // ρ = 0.002 on 100 bonds: 1 + 99·0.002 = 1.2 within batches.
    const of = { batches: 20, each: 200, trials: 100, p: 0.1, drift: 0.02, rho: 0.002 };
    expect(await share(of, 100, ({ split }) => split!.verdict === 'excess')).toBeGreaterThan(0.95);
    const { statement, split } = await report(made(9, of), 100);
    expect(statement).toMatch(/the excess survives within batches/);
    expect(split!.excessWithin.low!).toBeGreaterThan(0);
  });

  it('one bad batch among many is seen by itself', async () => {
    const list = made(3, { batches: 50, each: 100, trials: 100, p: 0.1, drift: 0, rho: 0 });
    const bad = made(4, { batches: 1, each: 100, trials: 100, p: 0.1, drift: 0, rho: 0.03 });
    const shots = [...list.shots.slice(0, 2000), ...bad.shots, ...list.shots.slice(2100)];
    const { split } = await report({ ...list, shots }, 100);
    expect(split!.worst!.batch).toBe(21);
    expect(split!.verdict).toBe('excess');
  });

  it('limits hold the truth in about 95 % of repeats', async () => {
    const of = { batches: 15, each: 60, trials: 100, p: 0.1, drift: 0.01, rho: 0 };
    const within = await share(
      of,
      100,
      ({ split }) => split!.dispersion.low! <= 1 && 1 <= split!.dispersion.high!
    );
    // The variance of batch means is (100·0.01)² = 1; uniform rates scatter less than normal ones.
    const means = await share(
      of,
      100,
      ({ split }) => split!.meansVariance.low! <= 1 && 1 <= split!.meansVariance.high!
    );
    for (const held of [within, means]) expect(held).toBeGreaterThan(0.88);
    expect(within).toBeLessThan(1);
  });

  it('with misreads allowed for, calls about 5 % of kinks as read, and sees a higher rate of misreads', async () => {
    const bonds = 30;
    const ceilingAt = misreadCeiling(bonds, 0.01);
    const called = async (rate: number) => {
      let hits = 0;
      for (let seed = 0; seed < repeats; seed++) {
        const random = generator(seed + 77, 0);
        const shots: number[] = [];
        const names: string[] = [];
        for (let b = 0; b < 6; b++)
          for (let i = 0; i < 150; i++) {
            let before = random.next() < rate;
            let count = 0;
            for (let k = 0; k < bonds; k++) {
              const flipped = random.next() < rate;
              // Drift of the kinks from batch to batch, 4 % to 6.5 %.
              if (random.next() < 0.04 + 0.005 * b !== (before !== flipped)) count++;
              before = flipped;
            }
            shots.push(count);
            names.push(`run ${b}`);
          }
        const mean = shots.reduce((a, n) => a + n, 0) / shots.length;
        const most = ceilingAt(mean);
        const window = chainWindow(
          Array.from(most.kinks!, (p) => ({ p, trials: 1 })),
          0.01,
          1e-18,
          1
        );
        const interval = (value: number) => ({ value, low: null, high: null });
        const part = await driftReport(
          { kind: 'shots', shots, batches: names },
          bonds,
          { mean: interval(mean), variance: interval(1), ceiling: most.variance },
          { ceiling: most.variance, mostDispersed: { window, ceiling: (at) => ceilingAt(at).variance } },
          { ...defaultOptions, trials: bonds, resamples: 19, seed },
          true,
          unbroken
        );
        if (part!.split!.p! <= 0.05) hits++;
      }
      return hits / repeats;
    };
    expect(await called(0.01)).toBeLessThanOrEqual(0.112);
    expect(await called(0.01)).toBeGreaterThan(0);
    expect(await called(0.03)).toBeGreaterThan(0.9);
  });

  it('is in the document and in the words of the answer', async () => {
    const list = made(7, { batches: 20, each: 200, trials: 100, p: 0.1, drift: 0.02, rho: 0 });
    const found = await diagnose(list, { ...defaultOptions, trials: 100, resamples: 999 });
    const { drift } = found.nuisances!;
    expect(found.answer.because).toContain(drift!.statement);
    expect(drift!.statement).toMatch(
      /within batches the counts are compatible with independent trials; the excess lies between batches\.$/
    );
    expect(found.answer.statement).toMatch(
      /within batches the counts are compatible with independent trials/
    );
    expect(drift!.means).toHaveLength(40);
    expect(drift!.means.some(({ outside }) => outside)).toBe(true);
    expect(JSON.stringify(drift)).not.toContain('run ');
    expect(drift!.split!.each).toHaveLength(20);
  });

  it('answers in words where nothing lies within a batch, or no batch is given', async () => {
    const list = made(1, { batches: 40, each: 1, trials: 100, p: 0.1, drift: 0, rho: 0 });
    expect(await report(list, 100)).toMatchObject({
      split: null,
      statement: expect.stringMatching(/^Every batch has one shot only/) as string
    });
    expect((await report({ ...list, batches: null }, 100)).statement).toMatch(/^No batches were given/);
    expect((await report({ ...list, batches: list.batches!.map(() => 'a') }, 100)).statement).toMatch(
      /^All shots belong to one batch/
    );
  });
});
