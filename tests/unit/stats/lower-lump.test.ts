import { diagnose } from '$lib/stats/diagnose';
import { defaultOptions } from '$lib/stats/default-options';
import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { floorLaw } from '$lib/stats/floor/floor-law';
import { generator } from '$lib/stats/random/generator';
import { BadInput, type Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { plainPmf } from './fit/plain';

/** Rows of `shots[n]` with counts up to `to`, and from `from` on, put together. */
function lumpedTable(shots: number[], to: number, from = Infinity): Histogram {
  const rows = shots.map((h, n): [number, number] => [n, h]).filter(([, h]) => h > 0);
  const sum = (inside: (n: number) => boolean) =>
    rows.reduce((total, [n, h]) => total + (inside(n) ? h : 0), 0);
  const above = sum((n) => n >= from);
  return {
    kind: 'histogram',
    counts: rows.filter(([n]) => n > to && n < from),
    lump: above > 0 ? { from, shots: above } : null,
    below: { to, shots: sum((n) => n <= to) }
  };
}

/** Σ h ln f by its definition, each lump by the sum of the pmf over it. */
function likelihood({ counts, lump, below }: Histogram, p: number[]): number {
  const f = plainPmf(p);
  const over = (from: number, to: number) => f.slice(from, to + 1).reduce((a, b) => a + b, 0);
  return (
    counts.reduce((sum, [n, h]) => sum + h * Math.log(f[n]), 0) +
    (below ? below.shots * Math.log(over(0, below.to)) : 0) +
    (lump ? lump.shots * Math.log(over(lump.from, p.length)) : 0)
  );
}

describe('the best law of counts lumped at the low end', () => {
  // Every law of three or four trials on a grid of step 1/40, and once more finely around the best of them.
  it.each([
    { trials: 3, table: lumpedTable([30, 45, 20, 5], 1) },
    { trials: 3, table: lumpedTable([4, 30, 50, 16], 1, 3) },
    { trials: 4, table: lumpedTable([10, 40, 60, 25, 9], 1) },
    { trials: 4, table: lumpedTable([2, 10, 44, 61, 20], 1, 4) }
  ])('is that of a search over all laws of $trials trials', ({ trials, table }) => {
    let best = { value: -Infinity, p: [] as number[] };
    const walk = (p: number[], grid: (j: number) => number[]) => {
      if (p.length === trials) {
        const value = likelihood(table, p);
        if (value > best.value) best = { value, p: [...p] };
        return;
      }
      for (const one of grid(p.length)) if (p.length === 0 || one >= p[p.length - 1]) walk([...p, one], grid);
    };
    const steps = trials === 3 ? 40 : 20;
    walk([], () => Array.from({ length: steps + 1 }, (_, i) => i / steps));
    for (let width = 1 / steps; width > 1e-5; width /= 3) {
      const around = best.p;
      const near = (j: number) =>
        [-1, -2 / 3, -1 / 3, 0, 1 / 3, 2 / 3, 1].map((k) => Math.min(1, Math.max(0, around[j] + k * width)));
      walk([], (j) => near(j));
    }
    const data = fitData(table, trials);
    const found = bestLaw(data);
    expect(found.logLikelihood).toBeGreaterThan(best.value - 1e-6);
    expect(found.logLikelihood).toBeLessThan(best.value + 1e-3);
    const saturated = [table.below!.shots, ...table.counts.map(([, h]) => h), table.lump?.shots ?? 0]
      .filter((h) => h > 0)
      .reduce((sum, h) => sum + h * Math.log(h / data.total), 0);
    expect(floorLaw(data).divergence).toBeLessThanOrEqual(
      (saturated - found.logLikelihood) / data.total + 1e-9
    );
  });
});

const options = { ...defaultOptions, resamples: 199 };

/** Shots of independent trials, by the plainest way there is. */
function drawn(p: number[], shots: number, seed: number): number[] {
  const random = generator(seed, 5);
  const out = new Array<number>(p.length + 1).fill(0);
  for (let s = 0; s < shots; s++) out[p.reduce((n, one) => n + (random.next() < one ? 1 : 0), 0)]++;
  return out;
}

describe('a diagnosis of counts lumped at the low end', () => {
  const shots = drawn(new Array<number>(12).fill(0.35), 2000, 3);

  it('draws the lump as one cell, fits it by the sum of the law, and leaves out what it hides', async () => {
    const table = lumpedTable(shots, 2, 8);
    const found = await diagnose(table, { ...options, trials: 12 });
    expect(found.answer.verdict).toBe('compatible');
    const [opening] = found.distribution;
    expect(opening).toMatchObject({ count: 2, lump: true, below: true, shots: table.below!.shots });
    const f = plainPmf(found.fit.levels.flatMap(({ p, trials }) => new Array<number>(trials).fill(p)));
    const law = [...f, ...new Array<number>(13 - f.length).fill(0)];
    expect(opening.fitted).toBeCloseTo(law[0] + law[1] + law[2], 10);
    expect(found.distribution.map(({ count }) => count)).toEqual([2, 3, 4, 5, 6, 7, 8]);
    expect(found.distribution.reduce((sum, point) => sum + point.fitted, 0)).toBeCloseTo(1, 10);
    expect(found.rate.points.map(({ count }) => count)).toEqual([3, 4, 5, 6, 7]);
    expect(found.tails.points.filter(({ side }) => side === 'low').map(({ count }) => count)).toEqual([
      2, 3, 4
    ]);
    expect(found.tails.points.filter(({ side }) => side === 'high').at(-1)?.count).toBe(8);
    expect(found.notRun.map(({ id }) => id)).toEqual(expect.arrayContaining(['parity', 'empty-shots']));
    expect(found.moments.criticalTrials).toBeNull();
    expect(found.data).toMatchObject({ below: table.below, lump: table.lump });
    expect(found.cautions.join(' ')).toContain('The first row lumps counts of 2 and fewer');
  });

  it('leaves a tail out whose counts all lie inside the lump', async () => {
    const found = await diagnose(lumpedTable(shots, 4), { ...options, trials: 12 });
    expect(found.notRun.find(({ id }) => id === 'low-tail')?.reason).toContain('opening row');
    expect(found.tests.some(({ id }) => id === 'high-tail')).toBe(true);
  });

  it('sees bunching through lumps at both ends', async () => {
    const mixed = drawn(new Array<number>(30).fill(0.15), 3000, 8).map(
      (h, n) => h + (drawn(new Array<number>(30).fill(0.35), 3000, 9)[n] ?? 0)
    );
    const found = await diagnose(lumpedTable(mixed, 3, 12), { ...options, resamples: 999, trials: 30 });
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags.map(({ id }) => id)).toContain('bunching');
  });

  it('takes "0 to 0" for the empty shots', async () => {
    const plain = lumpedTable(shots, 0);
    const rows: Histogram = {
      kind: 'histogram',
      counts: shots.map((h, n): [number, number] => [n, h]),
      lump: null
    };
    const [a, b] = await Promise.all([plain, rows].map((one) => diagnose(one, { ...options, trials: 12 })));
    expect(a).toEqual(b);
  });

  it.each([
    { counts: [[2, 5]], below: { to: 2, shots: 3 }, says: 'inside a row that lumps' },
    {
      counts: [[5, 5]],
      below: { to: 2, shots: 3 },
      lump: { from: 2, shots: 1 },
      says: 'inside a row that lumps'
    },
    { counts: [], below: { to: 2, shots: 3 }, says: 'nothing is left' }
  ] as { counts: [number, number][]; below: Histogram['below']; lump?: Histogram['lump']; says: string }[])(
    'refuses lumps that overlap or hold everything: $says',
    async ({ counts, below, lump = null, says }) => {
      const data: Histogram = { kind: 'histogram', counts, lump, below };
      await expect(diagnose(data, { ...options, trials: 12 })).rejects.toThrow(BadInput);
      await expect(diagnose(data, { ...options, trials: 12 })).rejects.toMatchObject({
        reason: expect.stringContaining(says)
      });
    }
  );

  it('with a cut declared is refused in words', async () => {
    const kept = { from: 0, to: 9 };
    await expect(diagnose(lumpedTable(shots, 2), { ...options, trials: 12, kept })).rejects.toMatchObject({
      reason: expect.stringContaining('opening row')
    });
  });

  // Independent trials, equal and spread, lumped below or at both ends: at level 5 % hardly more than 5 % ruled out.
  it('raises few false alarms', async () => {
    const truths = [
      new Array<number>(12).fill(0.3),
      [0.05, 0.1, 0.1, 0.2, 0.3, 0.3, 0.4, 0.5, 0.6, 0.8],
      new Array<number>(40).fill(0.08)
    ];
    let alarms = 0;
    for (let i = 0; i < 90; i++) {
      const p = truths[i % 3];
      const table = lumpedTable(drawn(p, 500, 100 + i), i % 2 ? 1 : 2, i % 4 < 2 ? 6 : Infinity);
      const found = await diagnose(table, { ...options, alpha: 0.05, seed: i, trials: p.length });
      if (found.answer.verdict === 'ruled-out') alarms++;
    }
    // 90 repeats at 5 %: 10 or more would turn up once in 60 repeats of this test.
    expect(alarms).toBeLessThan(10);
  }, 120_000);
});
