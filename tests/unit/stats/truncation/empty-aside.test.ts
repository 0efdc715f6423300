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
  it('leaves about 5 % excesses at 5 % where only dead shots were put in, and limits that hold 1', async () => {
    let excess = 0;
    let held = 0;
    for (let seed = 1; seed <= 150; seed++) {
      const found = await of(seed, equal);
      if (found.p <= 0.05) excess++;
      if (found.dispersion.low! <= 1 && 1 <= found.dispersion.high!) held++;
    }
    // 7.5 expected; four standard errors are 10.7.
    expect(excess).toBeLessThanOrEqual(18);
    expect(excess).toBeGreaterThan(0);
    expect(held / 150).toBeGreaterThan(0.89);
  });

  it('still sees bunching among the rest: ρ = 0.04', async () => {
    let seen = 0;
    for (let seed = 1; seed <= 20; seed++) if ((await of(seed, bunched)).verdict === 'excess') seen++;
    expect(seen).toBeGreaterThanOrEqual(16);
  });

  it('stands in the document where dead shots are flagged', async () => {
    const found = await diagnose(made(3, equal, 12_000), { ...defaultOptions, trials: 20, resamples: 999 });
    expect(found.flags.map(({ id }) => id)).toContain('dead-shots');
    expect(found.nuisances!.emptyAside).toMatchObject({ verdict: 'compatible' });
    expect(found.nuisances!.emptyAside!.statement).toMatch(/the rest keeps it/);
  });
});
