import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepOptions } from '$lib/stats/sweep/types';
import { describe, expect, it } from 'vitest';
import { drawn, lostInPairs } from './simulated';

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
  const held: SweepOptions = {
    axis: 'hold-time',
    timeUnit: 'ms',
    unit: 'defect',
    window: null,
    transition: null,
    alpha: 0.05
  };
  const factor = (laws: Float64Array[]) =>
    sweepReport(hold(laws), held).steady.find(({ id }) => id === 'pair-factor')!;

  it('of single defects keeps F2/F1², which is 0.09 here', () => {
    const found = factor(holds.map((t) => mixed(20 * Math.exp(-t / 16))));
    expect(found.p).toBeGreaterThan(0.05);
    expect(found.steady.low).toBeLessThan(0.09);
    expect(found.steady.high).toBeGreaterThan(0.09);
    const laws = holds.map((t) => mixed(20 * Math.exp(-t / 16)));
    const said = sweepReport(hold(laws), held).because.join(' ');
    expect(said).toMatch(
      /which loss of single defects .* a change by [\d.]+ would be seen in four of five repeats/
    );
  });

  it('says nothing where the mean does not fall, and speaks of pairs where pairs were counted', () => {
    const still = holds.map(() => mixed(20));
    expect(sweepReport(hold(still), held).because.join(' ')).toMatch(
      /The mean does not surely fall over the window, so F₂\/F₁² says nothing of how defects are lost/
    );
    const falling = holds.map((t) => mixed(20 * Math.exp(-t / 16)));
    const inPairs = sweepReport(hold(falling), { ...held, unit: 'pair' }).because.join(' ');
    expect(inPairs).toMatch(/loss of single pairs/);
    expect(inPairs).not.toMatch(/defects/);
  });

  it('in pairs changes it, and takes the variance towards two thirds of the mean', () => {
    const laws = holds.map((t) => lostInPairs(poisson(30), t / 40));
    expect(factor(laws).p).toBeLessThan(1e-6);
    expect(factor(laws).p).toBeGreaterThanOrEqual(1e-300);
    const { points } = sweepReport(hold(laws), held);
    // A + A → 0 in a well-mixed volume: variance/mean → 2/3 while the mean is large.
    expect(Math.abs(points[3].ratios![0].value - 2 / 3)).toBeLessThan(0.05);
  });
});
