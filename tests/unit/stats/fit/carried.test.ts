import { carried } from '$lib/stats/fit/carried';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { describe, expect, it } from 'vitest';
import { levelsOf } from './plain';

describe('carried', () => {
  it('takes one trial of each pool far away, N kept and the mean nearly', () => {
    const levels = levelsOf(
      [
        [0.3, 5],
        [0.8, 1]
      ],
      { ones: 2, zeros: 3 }
    );
    const found = carried(levels);
    expect(found.some(({ ones }) => ones === 1)).toBe(true);
    expect(found.some(({ zeros }) => zeros === 2)).toBe(true);
    // The single trial at 0.8 moved: its level is gone.
    expect(found.some(({ trials, ones, zeros }) => ones === 2 && zeros === 3 && trials[0] === 5)).toBe(true);
    for (const next of found) {
      expect(next.trials.reduce((a, b) => a + b, 0) + next.ones + next.zeros).toBe(11);
      expect(next.p.every((p) => p > 0 && p < 1)).toBe(true);
      expect(next.trials.every((m) => m >= 1)).toBe(true);
      expect(Math.abs(lawMoments(toLaw(next)).mean - lawMoments(toLaw(levels)).mean)).toBeLessThan(0.8);
    }
  });

  it('moves a Poisson part along with its levels', () => {
    const found = carried(levelsOf([], { zeros: Infinity, poissonPart: 3 }));
    // Not to 0.04, which is where the impossible trials nearly are.
    expect(found.map(({ p }) => p[0])).toEqual([0.35, 0.65, 0.96]);
    for (const next of found) expect(lawMoments(toLaw(next)).mean).toBeCloseTo(3, 9);
  });
});
