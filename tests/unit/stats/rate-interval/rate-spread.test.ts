import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { misreadCeiling } from '$lib/stats/misread/misread-ceiling';
import { describe, expect, it } from 'vitest';
import { readKinks } from '../misread/read-kinks';

const data = readKinks(3, 100, 0.05, 0.01, 20_000);
const given = (misread: number, misreadUncertainty: number) =>
  diagnose(data, {
    ...defaultOptions,
    trials: 100,
    geometry: 'open-bonds',
    resamples: 999,
    misread,
    misreadUncertainty
  });

describe('kinks p = 0.05 on 100 bonds read with ε = 0.01, 20 000 shots', () => {
  it('are compatible where the rate is known well', async () => {
    const found = await given(0.0101, 0.0001);
    const { spread } = found.nuisances!.misread!;
    expect(found.answer.verdict).toBe('compatible');
    expect(spread!.changes).toEqual([]);
    expect(spread!.rates.map(({ verdict }) => verdict)).not.toContain('ruled-out');
    expect(spread!.rates.length).toBeGreaterThanOrEqual(3);
    expect(spread!.low).toBeCloseTo(0.0101 - 3.890592 * 0.0001, 8);
    // Every rate has its own ceiling, and the variance over it.
    for (const { rate, ceiling, dispersion } of spread!.rates) {
      expect(ceiling).toBeCloseTo(misreadCeiling(100, rate)(found.moments.mean.value!).variance, 10);
      expect(dispersion.value! * ceiling).toBeCloseTo(found.moments.variance.value!, 9);
    }
    expect(found.cautions.join('\n')).toContain('worst over the interval');
    expect(found.data.misreadUncertainty).toBe(0.0001);
  }, 120_000);

  it('cannot tell where the rate may be half of that, and the rate at which the answer changes is named', async () => {
    const found = await given(0.008, 0.001);
    const { spread } = found.nuisances!.misread!;
    expect(found.answer.verdict).toBe('undecided');
    expect(found.answer.shotsToDecide).toBeNull();
    expect(found.answer.statement).toContain('because the misread rate is not known well enough');
    expect(spread!.rates[0].verdict).toBe('ruled-out');
    expect(spread!.rates.at(-1)!.verdict).toBe('compatible');
    const change = spread!.changes[0];
    // The rate that the variance needs is 0.0100; 5 % of excess at fewer would show.
    expect(change.from).toBe('ruled-out');
    expect(change.above).toBeGreaterThan(0.007);
    expect(change.below).toBeLessThan(0.0102);
    expect(change.below - change.above).toBeLessThanOrEqual((spread!.high - spread!.low) / 24 + 1e-12);
    expect(found.tests.every(({ pAdjusted }) => pAdjusted > 0.01)).toBe(true);
  }, 120_000);

  it('are ruled out where even the largest rate is too small', async () => {
    const found = await given(0.005, 0.0005);
    expect(found.answer.verdict).toBe('ruled-out');
    expect(found.nuisances!.misread!.spread!.statement).toContain(
      'At every rate tried independent trials are ruled out.'
    );
    // p of the ceiling test is that of the rate least against them, plus β.
    const { p } = found.tests.find(({ id }) => id === 'ceiling')!;
    expect(p).toBeGreaterThan(1e-4);
    expect(p).toBeLessThan(0.01);
  }, 120_000);
});
