import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { keptEqual } from '$lib/stats/truncation/kept-equal';
import { truncatedMoments } from '$lib/stats/truncation/truncated-moments';
import { windowMoments } from '$lib/stats/truncation/window-moments';
import { BadInput, type DiagnoseOptions, type Diagnosis, type Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

type Kept = { from: number; to: number | null };

/** Shots of a source until `shots` of them are kept. */
function trimmed(seed: number, shots: number, kept: Kept, draw: (random: Generator) => number): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let i = 0; i < shots;) {
    const n = draw(random);
    if (n < kept.from || n > (kept.to ?? Infinity)) continue;
    seen.set(n, (seen.get(n) ?? 0) + 1);
    i++;
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

const equal = (random: Generator) => binomialSample(random, 20, 0.1);
const spread = (random: Generator) => binomialSample(random, 4, 0.4) + binomialSample(random, 16, 0.05);
const bunched = (rho: number) => (random: Generator) =>
  binomialSample(random, 20, betaSample(random, 0.1 * (1 / rho - 1), 0.9 * (1 / rho - 1)));

const run = (data: Histogram, kept: Kept | null, over: Partial<DiagnoseOptions> = {}): Promise<Diagnosis> =>
  diagnose(data, { ...defaultOptions, trials: 20, resamples: 199, alpha: 0.05, kept, ...over });

describe('a declared cut', () => {
  it('takes away the look of regularity that it made: Bin(20, 0.1) at n ≤ 4', async () => {
    const kept = { from: 0, to: 4 };
    const data = trimmed(1, 20_000, kept, equal);
    const naive = await run(data, null);
    // Variance over mean 0.7255 of the cut law (published), over a mean of 1.9 or so.
    expect(naive.moments.fano.value!).toBeCloseTo(0.7255, 1);
    expect(naive.flags.map(({ id }) => id)).toContain('regular');
    const cut = await run(data, kept);
    expect(cut.flags.map(({ id }) => id)).not.toContain('regular');
    expect(cut.answer.verdict).toBe('compatible');
    expect(Math.abs(cut.moments.dispersion.value! - 1)).toBeLessThan(0.04);
    expect(cut.data.kept).toEqual(kept);
    expect(cut.tails.certificate).toBeNull();
    expect(cut.answer.because.join(' ')).toMatch(/of which only counts from 0 to 4 were kept/);
    // The law before the cut comes back: mean 2.
    const mean = cut.fit.levels.reduce((sum, { p, trials }) => sum + p * trials, 0);
    expect(Math.abs(mean - 2)).toBeLessThan(0.15);
  });

  it('bounds of the tails hold for the fitted law', async () => {
    const kept = { from: 1, to: 6 };
    const { tails } = await run(trimmed(3, 3000, kept, spread), kept);
    for (const { fitted, chernoff, meanChernoff } of tails.points) {
      expect(chernoff).toBeGreaterThanOrEqual(fitted * (1 - 1e-9));
      expect(meanChernoff).toBeGreaterThanOrEqual(fitted * (1 - 1e-9));
    }
  });

  it.each<[string, Kept, (random: Generator) => number]>([
    ['equal trials at n ≤ 4', { from: 0, to: 4 }, equal],
    ['unequal trials at n ≥ 1', { from: 1, to: null }, spread]
  ])('rules out no more than 5 %% or so at 5 %%: %s', async (_name, kept, draw) => {
    let out = 0;
    for (let seed = 0; seed < 60; seed++)
      if (
        (await run(trimmed(seed + 10, 1000, kept, draw), kept, { resamples: 159 })).answer.verdict ===
        'ruled-out'
      )
        out++;
    // 3 expected of 60; four standard errors are 6.8.
    expect(out).toBeLessThanOrEqual(9);
  });

  it('still sees bunching above the empty shots', async () => {
    const kept = { from: 1, to: null };
    let out = 0;
    for (let seed = 0; seed < 20; seed++)
      if (
        (await run(trimmed(seed, 4000, kept, bunched(0.03)), kept, { resamples: 159 })).answer.verdict ===
        'ruled-out'
      )
        out++;
    expect(out).toBeGreaterThanOrEqual(16);
  });

  it.each<[string, Kept, Partial<DiagnoseOptions>, RegExp]>([
    ['leaves nothing', { from: 5, to: 3 }, {}, /No count lies from 5 to 3: that cut leaves nothing/],
    ['leaves one count', { from: 2, to: 2 }, {}, /keeps only the count 2/],
    ['lies above N', { from: 20, to: null }, {}, /at most one count/],
    ['a count outside', { from: 0, to: 2 }, {}, /but only counts from 0 to 2 are said to be kept/],
    ['N unknown', { from: 0, to: 4 }, { trials: null }, /number of trials is known/],
    [
      'misreads too',
      { from: 0, to: 4 },
      { misread: 0.001, geometry: 'open-bonds' },
      /cannot both be allowed for/
    ]
  ])('refuses in words a cut that %s', async (_name, kept, over, reason) => {
    const data = trimmed(1, 300, { from: 0, to: 4 }, equal);
    await expect(run(data, kept, over)).rejects.toThrow(BadInput);
    await expect(run(data, kept, over)).rejects.toMatchObject({
      reason: expect.stringMatching(reason) as string
    });
  });
});

describe('keptEqual', () => {
  it('has the mean asked for, and at least the variance of other independent trials so cut', () => {
    const random = generator(5, 0);
    for (let k = 0; k < 300; k++) {
      const levels = [1, 2, 3].map(() => ({ p: random.next(), trials: 1 + Math.floor(random.next() * 5) }));
      const trials = levels.reduce((sum, level) => sum + level.trials, 0);
      const from = Math.floor(random.next() * (trials - 1));
      const to = from + 1 + Math.floor(random.next() * (trials - from));
      const cut = truncatedMoments({ levels, poissonPart: 0 }, { from, to });
      if (!cut) continue;
      const found = windowMoments(keptEqual(trials, { from, to }, cut.mean));
      expect(found.mean).toBeCloseTo(Math.min(Math.max(cut.mean, from), to), 6);
      expect(found.variance).toBeGreaterThanOrEqual(cut.variance * (1 - 1e-6) - 1e-7);
    }
  });
});
