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
      const ratio = steady[0].steady;
      if (ratio.low < 1 - Math.SQRT1_2 && ratio.high > 1 - Math.SQRT1_2) ratios++;
      if (common.exponent.low < 0.5 && common.exponent.high > 0.5) held++;
      if (common.p <= 0.05) refused++;
    }
    // 300 repeats: 285 ± 3.8 and 15 ± 3.8, four standard errors allowed.
    expect(held).toBeGreaterThanOrEqual(270);
    expect(ratios).toBeGreaterThanOrEqual(270);
    expect(refused).toBeLessThanOrEqual(30);
    expect(refused).toBeGreaterThan(0);
  });

  it('with 100 shots each the ratio is held in about 95 of 100 too, and the window does not seem to matter', () => {
    let held = 0;
    let moved = 0;
    for (let seed = 0; seed < 200; seed++) {
      const report = sweepReport(inputs(free, 900 + seed, 100), options);
      const { low, high } = report.steady[0].steady;
      if (low < 1 - Math.SQRT1_2 && high > 1 - Math.SQRT1_2) held++;
      if (
        sweepReport(inputs(free, 900 + seed), options).windows.some(
          ({ awayP }) => awayP !== null && awayP! <= 0.05
        )
      )
        moved++;
      expect(report.cautions.join(' ')).toMatch(/9 of the datasets in the window have fewer than 300 shots/);
    }
    // 190 ± 3.1, four standard errors allowed; weights from the errors themselves held 162.
    expect(held).toBeGreaterThanOrEqual(178);
    // At most 10 ± 3.1; windows counted one by one moved 42.
    expect(moved).toBeLessThanOrEqual(22);
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

describe('what is refused beyond what numbers hold', () => {
  const total = (pmf: Float64Array) => pmf.reduce((sum, p) => sum + p, 0);
  // Expected counts of a thousand million shots, so that nothing hangs on a draw.
  const huge = lossy.map((pmf, i) => ({
    label: `${i}`,
    time: times[i],
    counts: [...pmf]
      .map((p, n): [number, number] => [n, Math.round((p / total(pmf)) * 1e9)])
      .filter(([, seen]) => seen > 0)
  }));
  const report = sweepReport(huge, options);

  it('is told as what it lies under, and its size in standard errors', () => {
    const { p, z } = report.laws!.common;
    expect(p).toBe(1e-300);
    // ln p of χ² is close to −χ²/2, and that of a normal error to −z²/2.
    expect(z!).toBeGreaterThan(37);
    expect(z! / Math.sqrt(report.laws!.common.chiSquare)).toBeCloseTo(1, 1);
    const said = [report.statement, ...report.because].join(' ');
    expect(said).toMatch(/p under 1 × 10⁻³⁰⁰/);
    expect(said).not.toMatch(/p = 0[^.]|– standard/);
    expect(JSON.parse(JSON.stringify(report))).toEqual(report);
  });

  it('is held against no known law, nor warned of for looking like one', () => {
    for (const { p, references } of report.steady) if (p! <= 0.05) expect(references).toEqual([]);
    expect(report.steady[0].references).toEqual([]);
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
