import { bestLaw } from '$lib/stats/fit/best-law';
import { generator } from '$lib/stats/random/generator';
import { familyWindow } from '$lib/stats/resampling/fitted-law';
import { largestGSquared } from '$lib/stats/resampling/largest-g-squared';
import { redraw } from '$lib/stats/resampling/redraw';
import { refitted } from '$lib/stats/resampling/refitted';
import { chooseStatistics, lowTailOfTheRest } from '$lib/stats/resampling/statistics';
import { describe, expect, it } from 'vitest';
import { dataOf, type Problem } from '../fit/plain';

function chosen(problem: Problem) {
  const data = dataOf(problem);
  const of = refitted(data, bestLaw(data).levels);
  const { statistics, notRun } = chooseStatistics(of);
  return { of, statistics, skipped: Object.fromEntries(notRun.map(({ id, reason }) => [id, reason])) };
}

describe('chooseStatistics', () => {
  it('asks everything of an ordinary histogram', () => {
    const { statistics, skipped } = chosen({ shots: [3, 20, 50, 60, 40, 18, 6, 1], trials: 12 });
    expect([...statistics.keys()]).toEqual([
      'fit',
      'high-tail',
      'low-tail',
      'parity',
      'empty-shots',
      lowTailOfTheRest
    ]);
    expect(skipped).toEqual({});
  });

  it('asks nothing when every shot had the same count, and says so', () => {
    const { statistics, skipped } = chosen({ shots: [0, 0, 50], trials: 4 });
    expect(statistics.size).toBe(0);
    for (const id of ['fit', 'high-tail', 'low-tail', 'parity']) expect(skipped[id]).toMatch(/same count/);
    expect(skipped['empty-shots']).toMatch(/empty/);
  });

  it('asks for no tail where none is possible', () => {
    const rare = chosen({ shots: [60, 35, 5], trials: null });
    expect(rare.skipped['low-tail']).toMatch(/below the mean/);
    const frequent = chosen({ shots: [0, 1, 35, 60], trials: 3 });
    expect(frequent.skipped['high-tail']).toMatch(/above the mean/);
  });

  it('asks no parity of a lump, which hides it', () => {
    const { skipped } = chosen({ shots: [5, 20, 30], trials: 6, lump: { from: 3, shots: 20 } });
    expect(skipped.parity).toMatch(/closing row/);
  });

  it('asks nothing about empty shots when there are none, or when the others had one count', () => {
    expect(chosen({ shots: [0, 20, 30, 10], trials: 6 }).skipped['empty-shots']).toMatch(/No shot was empty/);
    expect(chosen({ shots: [20, 0, 30], trials: 6 }).skipped['empty-shots']).toMatch(/one count/);
  });

  it('gives G² = 2·S·D as the statistic of the fit', () => {
    const { of, statistics } = chosen({ shots: [30, 40, 30], trials: 2 });
    // Best law is binomial with p = ½: G² = 2[60 ln(30/25) + 40 ln(40/50)].
    const want = 2 * (60 * Math.log(30 / 25) + 40 * Math.log(40 / 50));
    expect(statistics.get('fit')!.of(of)).toBeCloseTo(want, 6);
  });

  it('takes a lump into the tails', () => {
    const plain = chosen({ shots: [30, 60, 40, 12, 3, 1, 2], trials: 9 });
    const lumped = chosen({ shots: [30, 60, 40, 12], trials: 9, lump: { from: 4, shots: 6 } });
    for (const { of, statistics } of [plain, lumped]) {
      const value = statistics.get('high-tail')!.of(of);
      expect(value).toBeGreaterThanOrEqual(0);
      expect(value).toBeLessThan(4);
    }
  });

  it('never gives a resample more than the law it was drawn from allows', () => {
    const problems: Problem[] = [
      { shots: [3, 20, 50, 60, 40, 18, 6, 1], trials: 12 },
      { shots: [30, 60, 40, 12], trials: 9, lump: { from: 4, shots: 6 } },
      { shots: [400, 90, 30, 9, 4, 2, 1], trials: null },
      { shots: [0, 0, 4, 30, 80, 30, 4], trials: 64 }
    ];
    let close = 0;
    for (const problem of problems) {
      const { of, statistics } = chosen(problem);
      const window = familyWindow(of.law, 1e-18, 1);
      const source = redraw(window, of.data, of.data.total);
      for (let b = 0; b < 60; b++) {
        const drawn = source.draw(generator(3, b));
        const most = largestGSquared(drawn, window);
        const again = refitted(drawn, of.fit.levels);
        for (const [id, statistic] of statistics) {
          const value = statistic.of(again);
          expect(statistic.needs(drawn, value), id).toBeLessThanOrEqual(most);
          if (statistic.needs(drawn, value) > 0.64 * most) close++;
        }
      }
    }
    // The bound is not idle: G² of few cells often comes near it.
    expect(close).toBeGreaterThan(20);
  });
});
