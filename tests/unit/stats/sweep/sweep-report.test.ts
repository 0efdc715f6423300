import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepInput, SweepOptions } from '$lib/stats/sweep/types';
import { BadInput } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { drawn, landauZenerPmf, lostInPairs, quenchTimes } from './simulated';

const options: SweepOptions = {
  axis: 'quench-time',
  timeUnit: 'ħ/J',
  unit: 'pair',
  window: null,
  transition: { dimension: 1, correlation: 1, dynamic: 1 },
  alpha: 0.05
};
const times = quenchTimes(9);
const inputs = (laws: Float64Array[], seed: number, shots = 5000): SweepInput[] =>
  drawn(laws, shots, seed).map((counts, i) => ({
    label: `a = ${times[i].toFixed(2)}`,
    time: times[i],
    counts
  }));

const free = times.map(landauZenerPmf);
const lossy = times.map((a, i) => lostInPairs(free[i], a / 2000));

// One draw as an example: of twenty such, one has the ratio outside its 95 % interval. How often is held below.
describe('a Landau–Zener sweep over two decades, 5000 shots each', () => {
  const report = sweepReport(inputs(free, 1), options);

  it('has the exponent ½ inside its interval, and one for all', () => {
    const { exponent, p } = report.laws!.common;
    expect(exponent.low).toBeLessThan(0.5);
    expect(exponent.high).toBeGreaterThan(0.5);
    expect(p).toBeGreaterThan(0.05);
    expect(report.expected).toMatchObject({ exponent: 0.5, inside: true });
    expect(report.statement).toMatch(/^One exponent, 0\.\d+ .*serves mean, variance and third cumulant/);
  });

  it('has the ratio 0.293 of pairs inside its interval', () => {
    const ratio = report.steady.find(({ id }) => id === 'variance-over-mean')!;
    expect(ratio.references.find(({ id }) => id === 'landau-zener')).toMatchObject({ inside: true });
    expect(ratio.references.find(({ id }) => id === 'landau-zener')!.value).toBeCloseTo(0.292893, 6);
    expect(ratio.references.find(({ id }) => id === 'rare-events')).toMatchObject({ inside: false });
    const third = report.steady.find(({ id }) => id === 'third-over-mean')!;
    expect(third.references[0].value).toBeCloseTo(0.03338, 5);
  });

  it('is the same bytes again, whatever the order of the datasets', () => {
    const again = sweepReport(inputs(free, 1).reverse(), options);
    expect(JSON.stringify(again)).toBe(JSON.stringify(report));
    expect(JSON.stringify(report)).not.toMatch(/null,"low"|NaN|Infinity/);
  });

  it('shows how the exponent moves with the window', () => {
    expect(report.windows).toHaveLength(13);
    for (const { exponent } of report.windows) expect(Math.abs(exponent.value - 0.5)).toBeLessThan(0.05);
  });
});

describe('over many repeats', () => {
  it('the intervals hold ½ and 0.293 in about 95 of 100, and one exponent is refused in about 5', () => {
    let held = 0;
    let ratios = 0;
    let refused = 0;
    for (let seed = 0; seed < 300; seed++) {
      const { laws, steady } = sweepReport(inputs(free, 100 + seed), options);
      const { common } = laws!;
      if (steady[0].references[0].inside) ratios++;
      if (common.exponent.low < 0.5 && common.exponent.high > 0.5) held++;
      if (common.p <= 0.05) refused++;
    }
    // 300 repeats: 285 ± 3.8 and 15 ± 3.8, four standard errors allowed.
    expect(held).toBeGreaterThanOrEqual(270);
    expect(ratios).toBeGreaterThanOrEqual(270);
    expect(refused).toBeLessThanOrEqual(30);
    expect(refused).toBeGreaterThan(0);
  });

  it('loss in pairs at the slow end is seen', () => {
    for (let seed = 0; seed < 20; seed++) {
      const report = sweepReport(inputs(lossy, 500 + seed), options);
      expect(report.laws!.common.p).toBeLessThan(0.05);
      expect(report.statement).toMatch(/refused/);
      expect(report.cautions.join(' ')).toMatch(/the cumulants alone do not say which/);
      expect(report.statement).not.toMatch(/loss|pair/);
      // Loss takes the third cumulant to 0: more shots would not give it a power law, and nobody may say so.
      if (report.laws!.quantities === 2)
        expect(report.because.join(' ')).toMatch(/third cumulant (is below 0|allows no power law).*left out/);
      expect(report.because.join(' ')).not.toMatch(/more shots/);
    }
  });
});

describe('loss after formation', () => {
  const holds = [1, 2, 4, 8, 16];
  const poisson = (mean: number) => {
    const pmf = new Float64Array(80);
    pmf[0] = Math.exp(-mean);
    for (let n = 1; n < 80; n++) pmf[n] = (pmf[n - 1] * mean) / n;
    return pmf;
  };
  /** Counts with a factor F2/F1² that is not 0: two Poisson settings. */
  const mixed = (mean: number) => {
    const [low, high] = [poisson(0.7 * mean), poisson(1.3 * mean)];
    return low.map((f, n) => (f + high[n]) / 2);
  };
  const hold = (laws: Float64Array[]) =>
    drawn(laws, 20_000, 8).map((counts, i) => ({ label: `${holds[i]} ms`, time: holds[i], counts }));
  const held = { ...options, axis: 'hold-time' as const, unit: 'defect' as const, transition: null };
  const factor = (laws: Float64Array[]) =>
    sweepReport(hold(laws), held).steady.find(({ id }) => id === 'pair-factor')!;

  it('of single defects keeps F2/F1², which is 0.09 here', () => {
    const found = factor(holds.map((t) => mixed(20 * Math.exp(-t / 16))));
    expect(found.p).toBeGreaterThan(0.05);
    expect(found.steady.low).toBeLessThan(0.09);
    expect(found.steady.high).toBeGreaterThan(0.09);
  });

  it('in pairs changes it, and takes the variance towards two thirds of the mean', () => {
    const laws = holds.map((t) => lostInPairs(poisson(30), t / 40));
    expect(factor(laws).p).toBeLessThan(1e-6);
    const { points } = sweepReport(hold(laws), held);
    // A + A → 0 in a well-mixed volume: variance/mean → 2/3 while the mean is large.
    expect(Math.abs(points[3].ratios![0].value - 2 / 3)).toBeLessThan(0.05);
  });
});

describe('what is no sweep', () => {
  const some = inputs(free, 4);
  it.each([
    ['one dataset', some.slice(0, 1), {}, 'at least two datasets'],
    ['a time of zero', [{ ...some[0], time: 0 }, ...some.slice(1)], {}, 'a time of 0'],
    ['times that are the same', some.map((one) => ({ ...one, time: 2 })), {}, 'nothing was swept'],
    ['a window that holds one time', some, { window: { from: 0.5, to: 1.2 } }, 'widen it'],
    ['a level of 0.7', some, { alpha: 0.7 }, 'below 0.5']
  ])('%s is refused in words', (_, given, other, words) => {
    expect(() => sweepReport(given, { ...options, ...other })).toThrow(BadInput);
    expect(() => sweepReport(given, { ...options, ...other })).toThrow(words);
  });

  it('a dataset of one count is left out in words', () => {
    const report = sweepReport([...some, { label: 'dead', time: 7, counts: [[0, 500]] }], options);
    expect(report.points.find(({ label }) => label === 'dead')).toMatchObject({ cumulants: null });
    expect(report.because.join(' ')).toContain(
      'Left out, since fewer than four different counts tell no errors: “dead”.'
    );
  });

  it('two datasets have exponents, and nothing that tests them', () => {
    const report = sweepReport([some[0], some[8]], options);
    expect(report.laws!.p).toBeNull();
    expect(report.because.join(' ')).toContain('With two datasets any power law fits');
  });
});
