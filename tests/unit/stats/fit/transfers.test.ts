import { toLaw, type TrialLevels } from '$lib/stats/fit/trial-levels';
import { transfers } from '$lib/stats/fit/transfers';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { describe, expect, it } from 'vitest';
import { levelsOf } from './plain';

const levels = levelsOf(
  [
    [0.2, 6],
    [0.7, 3]
  ],
  { ones: 2, zeros: 4 }
);
const total = (of: TrialLevels) => of.trials.reduce((a, b) => a + b, 0) + of.ones + of.zeros;

describe('transfers', () => {
  it('pass trials between neighbours, N and the mean kept', () => {
    const found = transfers(levels, 1);
    expect(found.length).toBeGreaterThan(5);
    for (const next of found) {
      expect(total(next)).toBe(total(levels));
      const clipped = next.p.some((p) => p === 0.001 || p === 0.999);
      if (!clipped) expect(lawMoments(toLaw(next)).mean).toBeCloseTo(lawMoments(toLaw(levels)).mean, 9);
      expect(next).not.toEqual(levels);
    }
    // From the sure trials to the level at 0.7, and back.
    expect(found.some(({ ones, trials }) => ones === 1 && trials[1] === 4)).toBe(true);
    expect(found.some(({ ones, trials }) => ones === 3 && trials[1] === 2)).toBe(true);
  });

  it('exchange two multiplicities', () => {
    expect(transfers(levels, 1).some(({ trials }) => trials[0] === 3 && trials[1] === 6)).toBe(true);
  });

  it('leave no level or pool empty or negative, and do not touch the given law', () => {
    const before = JSON.stringify(levels);
    for (const size of [1, 2, 4, 16]) {
      for (const next of transfers(levels, size)) {
        expect(next.trials.every((m) => m >= 1)).toBe(true);
        expect(Math.min(next.ones, next.zeros)).toBeGreaterThanOrEqual(0);
        expect(next.p.every((p) => p > 0 && p < 1)).toBe(true);
      }
    }
    expect(transfers(levels, 16)).toHaveLength(0);
    expect(JSON.stringify(levels)).toBe(before);
  });
});
