import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { chainMoments } from '$lib/stats/misread/chain-moments';
import { misreadCeiling } from '$lib/stats/misread/misread-ceiling';
import { describe, expect, it } from 'vitest';
import { readKinks } from '../misread/read-kinks';

const data = readKinks(3, 100, 0.05, 0.01, 20_000);
const chain = { ...defaultOptions, trials: 100, geometry: 'open-bonds' as const, resamples: 999 };

describe('independent kinks p = 0.05 on 100 bonds, 1 % of the sites misread, 20 000 shots', () => {
  it('look bunched where nothing is said of misreads', async () => {
    const found = await diagnose(data, { ...defaultOptions, trials: 100, resamples: 999 });
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags.find(({ id }) => id === 'bunching')?.grade).toBe('shown');
    expect(found.nuisances?.misread).toBeUndefined();
  });

  it('are compatible with the rate stated, and both ceilings stand in the document', async () => {
    const found = await diagnose(data, { ...chain, misread: 0.01 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.flags).toEqual([]);
    const misread = found.nuisances!.misread!;
    expect(misread.applied).toBe(true);
    const mean = found.moments.mean.value!;
    expect(misread.rawCeiling).toBeCloseTo(mean * (1 - mean / 100), 10);
    expect(misread.ceiling).toBe(misreadCeiling(100, 0.01)(mean).variance);
    expect(found.moments.ceiling).toBe(misread.ceiling);
    // The truth's own ratio to its ceiling is known, and its rate lies within the limits of the rate needed.
    const truth = chainMoments([{ p: 0.05, trials: 100 }], 0.01);
    expect(
      Math.abs(misread.rawDispersion! - truth.variance / (truth.mean * (1 - truth.mean / 100)))
    ).toBeLessThan(0.03);
    expect(misread.neededRate.low!).toBeLessThan(0.0101);
    expect(misread.neededRate.high!).toBeGreaterThan(0.0099);
    expect(found.cautions.join('\n')).toContain(
      'every test, bound and flag here allows for exactly that rate'
    );
    // Bounds hold: the fitted tail lies below each.
    for (const { fitted, chernoff, hoeffding, meanChernoff } of found.tails.points) {
      for (const bound of [chernoff, hoeffding, meanChernoff])
        expect(fitted).toBeLessThanOrEqual(bound * (1 + 1e-9));
    }
  });

  it('keep the rest of the excess when half the rate is stated', async () => {
    const found = await diagnose(data, { ...chain, misread: 0.005 });
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.flags[0].id).toBe('bunching');
    expect(found.moments.dispersion.low!).toBeGreaterThan(1.05);
    expect(found.answer.because.join(' ')).toContain('Without misreads it would be 1.22 times the ceiling.');
  });
});

describe('a rate that cannot be allowed for', () => {
  it.each([
    ['sites', { geometry: 'sites', misread: 0.01 }, /hold as they stand/],
    [
      'odd counts round a ring',
      { geometry: 'ring-bonds', misread: 0.01 },
      /no rate gives the \d+ odd counts/
    ],
    ['no number of bonds', { trials: null, misread: 0.01 }, /Without the number of bonds/],
    ['a rate far beyond what the mean allows', { misread: 0.2 }, /These counts allow 3\.\d\d\u202f% at most/],
    [
      'a rate that the mean refutes',
      { misread: 0.08 },
      /cannot be right: misreads alone would show 14\.7 kinks/
    ]
  ] as const)('is said so: %s', async (_name, over, why) => {
    const small = readKinks(4, 100, 0.05, 0.01, 400);
    const found = await diagnose(small, { ...chain, resamples: 19, ...over });
    expect(found.cautions.join('\n')).toMatch(why);
    expect(found.nuisances?.misread?.applied ?? false).toBe(false);
    expect(found.moments.ceiling).toBeCloseTo(
      found.moments.mean.value! * (1 - ('trials' in over ? 0 : found.moments.mean.value! / 100)),
      9
    );
  });
});
