import { SequentialP } from '$lib/stats/multiple/sequential-p';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

function run(resamples: number, exceedances: number, answers: (draw: number) => boolean): SequentialP {
  const tally = new SequentialP(resamples, exceedances);
  for (let draw = 1; tally.push(answers(draw)); draw++);
  return tally;
}

describe('SequentialP', () => {
  it('stops at the h-th exceedance with p = h/l', () => {
    const tally = run(1999, 10, (draw) => draw % 5 === 0);
    expect([tally.draws, tally.p, tally.stoppedEarly]).toEqual([50, 0.2, true]);
  });

  it('runs to the end otherwise, with p = (g + 1)/(B + 1)', () => {
    const tally = run(1999, 100, (draw) => draw % 50 === 0);
    expect([tally.draws, tally.p, tally.stoppedEarly]).toEqual([1999, 40 / 2000, false]);
    expect(run(1999, 100, () => false).p).toBe(tally.smallestP);
  });

  it('counts nothing after the end', () => {
    const tally = run(1999, 1, () => true);
    expect(tally.push(true)).toBe(false);
    expect([tally.draws, tally.exceeded, tally.p]).toEqual([1, 1, 1]);
  });

  it('keeps the level: P(p ≤ x) ≤ x when the observed statistic is one draw more', () => {
    const source = generator(3, 0);
    const runs = 20_000;
    const levels = [0.01, 0.05, 0.1, 0.2, 0.5];
    const below = levels.map(() => 0);
    for (let i = 0; i < runs; i++) {
      // Given the observed statistic at quantile u, each resample exceeds it with probability u.
      const u = source.next();
      const { p } = run(199, 10, () => source.next() < u);
      levels.forEach((x, j) => (below[j] += p <= x ? 1 : 0));
    }
    levels.forEach((x, j) => {
      const deviation = Math.sqrt((x * (1 - x)) / runs);
      expect(below[j] / runs).toBeLessThan(x + 3 * deviation);
      // The rule gives exact levels on the grid (k/200 below h/B, h/l above): nothing is lost at these x.
      expect(below[j] / runs).toBeGreaterThan(x - 3 * deviation);
    });
  });

  it('refuses impossible sizes', () => {
    expect(() => new SequentialP(0)).toThrow(RangeError);
    expect(() => new SequentialP(99, 1.5)).toThrow(RangeError);
  });
});
