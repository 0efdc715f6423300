import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { ringCeiling } from '$lib/stats/misread/ring-ceiling';
import { ringMoments } from '$lib/stats/misread/ring-moments';
import type { DiagnoseOptions, Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { readRing } from '../misread/read-ring';

const data = readRing(3, 100, 0.05, 0.01, 20_000);
const ring = { ...defaultOptions, trials: 100, geometry: 'ring-bonds' as const, resamples: 999 };

describe('independent kinks p = 0.05 round 100 bonds, 1 % of the sites misread, 20 000 shots', () => {
  it('look paired and bunched where nothing is said of misreads; the rate that would do is told', async () => {
    const found = await diagnose(data, ring);
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags.map(({ id }) => id)).toEqual(['pairing', 'misreads']);
    // Equal kinks round a ring with their sites misread are one of the stories, and the one that is true here.
    const [first] = found.explanations!.ranked;
    expect(first.id).toBe('misread-sites');
    expect(first.parameter!.low).toBeLessThan(0.01);
    expect(first.parameter!.high).toBeGreaterThan(0.01);
    const { applied, neededRate, rawDispersion } = found.nuisances!.misread!;
    expect(applied).toBe(false);
    expect(neededRate.low!).toBeLessThan(0.01);
    expect(neededRate.high!).toBeGreaterThan(0.01);
    // Ceiling and variance of the truth: rings without misreads of that mean, and the ring itself.
    const truth = ringMoments(100, 0.05, 0.01);
    expect(Math.abs(rawDispersion! - truth.variance / ringCeiling(100, 0)(truth.mean).variance)).toBeLessThan(
      0.03
    );
  });

  it('are compatible with the rate stated, and both ceilings stand in the document', async () => {
    const found = await diagnose(data, { ...ring, misread: 0.01 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.flags).toEqual([]);
    const misread = found.nuisances!.misread!;
    expect(misread.applied).toBe(true);
    const mean = found.moments.mean.value!;
    expect(misread.ceiling).toBe(ringCeiling(100, 0.01)(mean).variance);
    expect(misread.rawCeiling).toBe(ringCeiling(100, 0)(mean).variance);
    expect(found.moments.ceiling).toBe(misread.ceiling);
    expect(found.nuisances!.pairs!.proposed).toBe(false);
    expect(found.notRun.find(({ id }) => id === 'parity')?.reason).toContain(
      'Round a ring every count is even'
    );
    expect(found.fit.how).toContain('round a ring but for their even total');
    expect(found.cautions.join('\n')).toContain('single kinks that form independently round the ring');
    for (const { fitted, chernoff, hoeffding, meanChernoff } of found.tails.points) {
      for (const bound of [chernoff, hoeffding, meanChernoff])
        expect(fitted).toBeLessThanOrEqual(bound * (1 + 1e-9));
    }
  });

  it('are not ruled out with a rate that is stated with its uncertainty', async () => {
    const some = readRing(6, 30, 0.05, 0.01, 2000);
    const stated = { trials: 30, resamples: 199, misread: 0.008, misreadUncertainty: 0.001 };
    const found = await diagnose(some, { ...ring, ...stated });
    expect(found.answer.verdict).not.toBe('ruled-out');
    expect(found.tests.find(({ id }) => id === 'ceiling')!.p).toBeGreaterThan(0.05);
    expect(found.nuisances!.misread!.spread!.low).toBeLessThan(0.006);
  });

  it('keep the rest of the excess when half the rate is stated', async () => {
    const found = await diagnose(data, { ...ring, misread: 0.005 });
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags[0].id).toBe('bunching');
    expect(found.flags[0].otherCauses[0]).toContain('independent pairs');
    expect(found.nuisances!.pairs!.statement).toContain('Counting pairs tests something else');
    expect(found.moments.dispersion.low!).toBeGreaterThan(1.05);
    expect(found.answer.because.join(' ')).toContain('Without misreads it would be 1.26 times the ceiling.');
  });

  it('counted in pairs are tested as pairs, and the rate is said not to be allowed for', async () => {
    const found = await diagnose(data, { ...ring, resamples: 199, unit: 'pair', misread: 0.01 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.nuisances?.misread).toBeUndefined();
    expect(found.cautions.join('\n')).toContain(
      'Counted singly, kinks that form independently round the ring'
    );
  });
});

describe('a ring whose rate cannot be allowed for', () => {
  const told = async (counts: Histogram, over: Partial<DiagnoseOptions>) => {
    const found = await diagnose(counts, { ...ring, resamples: 19, ...over });
    expect(found.nuisances?.misread?.applied ?? false).toBe(false);
    return found.cautions.join('\n');
  };
  const few = readRing(4, 100, 0.05, 0.01, 400);
  const rows = (...counts: [number, number][]): Histogram => ({ kind: 'histogram', counts, lump: null });

  it('says why: odd counts, a rate beyond the mean or the method, no length, too short, too many kinks', async () => {
    const odd = rows([2, 50], [3, 1], [4, 50]);
    expect(await told(odd, { misread: 0.01 })).toContain('no rate gives the odd count seen: a site was lost');
    expect(await told(few, { misread: 0.08 })).toMatch(
      /cannot be right: misreads alone would show 14\.7 kinks/
    );
    expect(await told(rows([0, 40], [2, 60]), { trials: 4, misread: 0.1 })).toContain('Above 9.17\u202f%');
    expect(await told(few, { trials: null, misread: 0.01 })).toContain('Without the number of bonds');
    expect(await told(rows([0, 50], [2, 50]), { trials: 2, misread: 0.01 })).toContain(
      'on rings of 3 to 1\u202f000 bonds'
    );
    expect(await told(few, { geometry: 'open-bonds', unit: 'pair', misread: 0.01 })).toContain(
      'kinks counted in pairs on an open chain it is written down but not allowed for'
    );
    expect(await told(rows([4, 50], [6, 50]), { trials: 9, misread: 0.01 })).toContain(
      'at most half of them are read as kinks'
    );
  });

  it('is refused where the rate is none', async () => {
    await expect(diagnose(few, { ...ring, misread: 0.5 })).rejects.toThrow(/misread/i);
  });
});
