import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { generator } from '$lib/stats/random/generator';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { plainPmf } from '../fit/plain';
import { openBonds } from './misread-chain';

/** Histograms in the numbers expected of a cause, so that a flag is raised by it and not by luck. */
function expected(shots: number, pmf: number[]): CountData {
  const counts = pmf.map((f, n): [number, number] => [n, Math.round(shots * f)]).filter(([, h]) => h > 0);
  return { kind: 'histogram', counts, lump: null };
}

const binomial = (trials: number, p: number) => plainPmf(new Array<number>(trials).fill(p));
const mixture = (parts: [number, number[]][]) =>
  parts[0][1].map((_, n) => parts.reduce((sum, [share, pmf]) => sum + share * (pmf[n] ?? 0), 0));

function check(data: CountData, options: Partial<DiagnoseOptions>): Promise<Diagnosis> {
  return diagnose(data, { ...defaultOptions, resamples: 999, ...options });
}
const ids = ({ flags }: Diagnosis) => flags.map(({ id, grade }) => `${id} ${grade}`);

/** Shots one by one from a seeded stream: count of `trials` trials whose p may change with the shot. */
function list(shots: number, trials: number, p: (shot: number) => number): number[] {
  const random = generator(11, 0);
  return Array.from({ length: shots }, (_, s) => {
    let count = 0;
    for (let k = 0; k < trials; k++) if (random.next() < p(s)) count++;
    return count;
  });
}

describe('flags raised by data made for them', () => {
  it('none, for independent trials: equal, spread, rare', async () => {
    for (const [pmf, trials] of [
      [binomial(20, 0.3), 20],
      [binomial(20, 0.3), null],
      [plainPmf([], 1.4, 20), null]
    ] as const) {
      const found = await check(expected(3000, pmf), { trials });
      expect(found.flags.filter(({ id }) => id !== 'regular')).toEqual([]);
      expect(found.answer.verdict).toBe('compatible');
    }
    const spread = await check(expected(3000, plainPmf([0.9, 0.8, 0.7, 0.3, 0.2, 0.1, 0.1, 0.05])), {
      trials: 8
    });
    expect(ids(spread)).toEqual(['regular shown']);
  });

  it('bunching, for two settings pooled', async () => {
    const found = await check(
      expected(
        3000,
        mixture([
          [0.5, binomial(20, 0.2)],
          [0.5, binomial(20, 0.4)]
        ])
      ),
      { trials: 20 }
    );
    // With zeros too many for the rest at hand, which is named as one of its causes.
    expect(ids(found)[0]).toBe('bunching shown');
    expect(ids(found).join()).not.toMatch(/bursts|coarsening|pairing|drift/);
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags[0].otherCauses.join()).toMatch(/pooled/);
  });

  it('bursts, for one shot in 300 with most sites hit', async () => {
    const found = await check(
      expected(
        6000,
        mixture([
          [299 / 300, binomial(20, 0.3)],
          [1 / 300, binomial(20, 0.9)]
        ])
      ),
      { trials: 20 }
    );
    expect(ids(found)).toEqual(['bursts shown']);
    expect(found.answer.verdict).toBe('ruled-out');
  });

  it('coarsening, for one shot in 200 with a third of the defects', async () => {
    const found = await check(
      expected(
        6000,
        mixture([
          [199 / 200, binomial(40, 0.4)],
          [1 / 200, binomial(40, 0.12)]
        ])
      ),
      { trials: 40 }
    );
    expect(ids(found)).toEqual(['coarsening shown']);
  });

  it('dead shots, for one in 100 that failed', async () => {
    const found = await check(
      expected(
        6000,
        mixture([
          [0.99, binomial(20, 0.3)],
          [0.01, [1, ...new Array<number>(20).fill(0)]]
        ])
      ),
      { trials: 20 }
    );
    expect(ids(found)).toContain('dead-shots shown');
    expect(ids(found).join()).not.toMatch(/coarsening|pairing|bunching/);
    expect(found.flags.find(({ id }) => id === 'dead-shots')!.size).toMatch(/^65 empty shots/);
  });

  it('pairing, for kinks on a ring; counted as pairs they are compatible', async () => {
    const pairs = binomial(10, 0.3);
    const ring = expected(
      3000,
      Array.from({ length: 21 }, (_, n) => (n % 2 === 0 ? pairs[n / 2] : 0))
    );
    const single = await check(ring, { trials: 20 });
    expect(ids(single)).toEqual(['pairing shown']);
    expect(single.answer.verdict).toBe('ruled-out');
    expect(single.answer.statement).toMatch(/pairs should be counted/);
    const paired = await check(ring, { trials: 20, unit: 'pair' });
    expect(ids(paired)).toEqual([]);
    expect(paired.answer.verdict).toBe('compatible');
    expect(paired.moments.mean.value).toBeCloseTo(3, 2);
  });

  it('pairing, for a mild preference of even counts', async () => {
    const pmf = binomial(20, 0.3).map((f, n) => f * (n % 2 === 0 ? 1.1 : 0.9));
    expect(ids(await check(expected(6000, pmf), { trials: 20 }))).toEqual(['pairing shown']);
  });

  it('bunching with misreads hinted, for independent kinks read with 1 % of flips', async () => {
    const kinks = expected(6000, openBonds(50, 0.05, 0.01));
    const open = await check(kinks, { trials: 50, geometry: 'open-bonds' });
    expect(ids(open)).toContain('misreads hinted');
    expect(open.flags.find(({ id }) => id === 'misreads')!.size).toMatch(
      /misread rate of (1\.0|0\.9\d?)\u202f%/
    );
    expect(open.answer.statement).toMatch(/misread sites alone could give this/);
    expect(open.moments.dispersion.value).toBeCloseTo(1.239, 2);
    const sites = await check(kinks, { trials: 50 });
    expect(ids(sites).join()).not.toMatch(/misreads/);
  });

  it('drift, for a rate that changes while shots are taken, and for batches', async () => {
    const steady = list(1200, 20, () => 0.3);
    const drifting = list(1200, 20, (shot) => 0.22 + (0.16 * shot) / 1200);
    const found = await check({ kind: 'shots', shots: drifting, batches: null }, { trials: 20 });
    expect(ids(found)[0]).toBe('drift shown');
    const batches = drifting.map((_, shot) => `run ${Math.floor(shot / 300)}`);
    const grouped = await check({ kind: 'shots', shots: drifting, batches }, { trials: 20 });
    expect(grouped.flags[0].tests).toContain('batches');
    const calm = await check({ kind: 'shots', shots: steady, batches }, { trials: 20 });
    expect(ids(calm).join()).not.toMatch(/drift/);
  });
});
