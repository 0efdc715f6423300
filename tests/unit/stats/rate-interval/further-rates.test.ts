import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { fitData } from '$lib/stats/fit/fit-data';
import { generator, type Generator } from '$lib/stats/random/generator';
import { atRate } from '$lib/stats/rate-interval/at-rate';
import { unbroken } from '$lib/stats/resampling/pace';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** One reading, spin by spin: nothing of the law is used. */
function read(random: Generator, bonds: number, p: number, rate: number): number {
  let spin = false;
  let seen = random.next() < rate;
  let count = 0;
  for (let bond = 0; bond < bonds; bond++) {
    if (random.next() < p) spin = !spin;
    const next = random.next() < rate ? !spin : spin;
    if (next !== seen) count++;
    seen = next;
  }
  return count;
}

function shotsOf(seed: number, shots: number, shot: (random: Generator) => number): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let i = 0; i < shots; i++) {
    const n = shot(random);
    seen.set(n, (seen.get(n) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

const RESAMPLES = 199;
const ALPHA = 0.05;

/** Invented kinks of six causes, each with a misread rate known to a fifth or so, and what ought to be seen. */
const sets: [name: string, bonds: number, rate: number, uncertainty: number, histogram: Histogram][] = [
  ['independent', 20, 0.02, 0.003, shotsOf(1, 1500, (r) => read(r, 20, 0.08, 0.02))],
  ['two settings', 20, 0.01, 0.001, shotsOf(2, 1500, (r) => read(r, 20, r.next() < 0.5 ? 0.05 : 0.11, 0.01))],
  ['dead shots', 20, 0.01, 0.002, shotsOf(3, 1500, (r) => (r.next() < 0.04 ? 0 : read(r, 20, 0.14, 0.01)))],
  [
    'odd made even',
    20,
    0.01,
    0.002,
    shotsOf(4, 1500, (r) => {
      const n = read(r, 20, 0.1, 0.01);
      return n % 2 === 1 && r.next() < 0.12 ? n - 1 : n;
    })
  ],
  ['bursts', 20, 0.01, 0.002, shotsOf(5, 1500, (r) => read(r, 20, r.next() < 0.004 ? 0.5 : 0.08, 0.01))],
  [
    'few kinks, a rate that the counts cut',
    20,
    0.012,
    0.003,
    shotsOf(6, 1500, (r) => read(r, 20, 0.004, 0.01))
  ]
];

describe('no p between the rates tried is out of alarm where the worst of them is in it', () => {
  it.each(sets)(
    '%s',
    async (_, bonds, rate, uncertainty, histogram) => {
      const options = {
        ...defaultOptions,
        trials: bonds,
        geometry: 'open-bonds' as const,
        alpha: ALPHA,
        resamples: RESAMPLES,
        misread: rate,
        misreadUncertainty: uncertainty
      };
      const found = await diagnose(histogram, options);
      const { low, high, miss } = found.nuisances!.misread!.spread!;
      const counts = fitData(histogram, bonds);
      const worst = new Map<string, number>();
      for (let i = 0; i <= 12; i++) {
        const { tests } = await atRate(counts, histogram, low + ((high - low) * i) / 12, options, unbroken);
        for (const { id } of found.tests)
          worst.set(id, Math.max(worst.get(id) ?? 0, tests.find((test) => test.id === id)?.p ?? 1));
      }
      // A p of 0.05 from 199 resamples has a standard error of 0.015: three of them.
      for (const { id, p, pAdjusted } of found.tests) {
        if (pAdjusted <= ALPHA) expect(worst.get(id)! + miss, id).toBeLessThan(p + 0.046);
      }
    },
    120_000
  );
});

describe('rates', () => {
  const stated = { ...defaultOptions, trials: 20, geometry: 'open-bonds' as const, resamples: 199 };
  const ratesOf = async (which: number) => {
    const [, , misread, misreadUncertainty, histogram] = sets[which];
    const found = await diagnose(histogram, { ...stated, alpha: ALPHA, misread, misreadUncertainty });
    return { found, spread: found.nuisances!.misread!.spread! };
  };

  it('are looked at further where a test of the fit alarms at the first four, and rise', async () => {
    const { found, spread } = await ratesOf(2);
    expect(found.answer.verdict).toBe('ruled-out');
    expect(spread.rates.length).toBeGreaterThanOrEqual(11);
    for (let i = 1; i < spread.rates.length; i++)
      expect(spread.rates[i].rate).toBeGreaterThan(spread.rates[i - 1].rate);
  }, 60_000);

  it('are no more than four where nothing alarms at all of them and the answer does not change', async () => {
    const [, bonds, , , histogram] = sets[0];
    const options = { ...stated, trials: bonds, tolerance: 0.5, misread: 0.02, misreadUncertainty: 0.0002 };
    const { spread } = (await diagnose(histogram, options)).nuisances!.misread!;
    expect(spread!.changes).toEqual([]);
    expect(spread!.rates.length).toBeLessThanOrEqual(4);
  }, 60_000);
});
