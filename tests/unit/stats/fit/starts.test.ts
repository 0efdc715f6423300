import { sampleMoments } from '$lib/stats/fit/sample-moments';
import { alike, starts } from '$lib/stats/fit/starts';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { lawMoments } from '$lib/stats/laws/law-moments';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf } from './plain';

describe('alike', () => {
  it('is equal trials, a Poisson law when N is unknown, and the ends at mean 0 and N', () => {
    expect(alike(8, 2)).toMatchObject({ p: [0.25], trials: [8], ones: 0, zeros: 0 });
    expect(alike(null, 2)).toMatchObject({ p: [], zeros: Infinity, poissonPart: 2 });
    expect(alike(8, 0)).toMatchObject({ p: [], ones: 0, zeros: 8 });
    expect(alike(8, 8)).toMatchObject({ p: [], ones: 8, zeros: 0 });
  });
});

describe('starts', () => {
  it('are laws of N trials inside (0, 1), with the sample mean, equal trials among them', () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(60), { minLength: 1, maxLength: 20 }),
        fc.option(fc.nat(200)),
        (shots, more) => {
          fc.pre(shots.some((h) => h > 0));
          const trials = more === null ? null : shots.length + more;
          const data = dataOf({ shots, trials });
          const moments = sampleMoments(data);
          const range = { first: data.first, last: data.first + data.shots.length - 1 };
          const found = starts(trials, moments, range);
          expect(found).toContainEqual(alike(trials, moments.mean));
          for (const levels of found) {
            // No count seen is impossible.
            const possible = levels.ones + levels.trials.reduce((a, b) => a + b, 0);
            expect(levels.ones).toBeLessThanOrEqual(range.first);
            if (levels.poissonPart === 0) expect(possible).toBeGreaterThanOrEqual(range.last);
            const total = levels.trials.reduce((a, b) => a + b, 0) + levels.ones + levels.zeros;
            expect(total).toBe(trials ?? Infinity);
            expect(levels.trials.every((m) => Number.isInteger(m) && m > 0)).toBe(true);
            expect(levels.p.every((p) => p > 0 && p < 1)).toBe(true);
            const { mean } = lawMoments(toLaw(levels));
            // The mean is kept where no level had to be clipped (for unknown N, to nine tenths of 0.999).
            const free = levels.p.every((p) => p > 0.0011 && p < 0.899);
            if (free) expect(Math.abs(mean - moments.mean)).toBeLessThan(1e-9 * (1 + mean));
          }
        }
      )
    );
  });

  it('tries two levels below the ceiling, above it too, but not with hundreds of trials', () => {
    const two = (trials: number, variance: number) =>
      starts(trials, { mean: 4, variance, third: 1 }, { first: 0, last: 9 }).filter(
        ({ p }) => p.length === 2
      );
    expect(two(12, 1.5)).toHaveLength(5);
    expect(two(12, 3)).toHaveLength(10);
    expect(two(400, 1.5)).toHaveLength(0);
    for (const { p, trials } of two(12, 1.5)) {
      // Σp(1−p) is the variance asked for, where no level had to be clipped.
      const variance = p.reduce((sum, one, j) => sum + trials[j] * one * (1 - one), 0);
      if (p.every((one) => one > 0.001 && one < 0.999)) expect(variance).toBeCloseTo(1.5, 9);
    }
  });

  it('begins with the law of sure and alike trials that has the three moments seen', () => {
    // 2 sure, 6 at 0.4, 4 impossible: variance 1.44, third 1.44·0.2.
    const [first] = starts(12, { mean: 4.4, variance: 1.44, third: 0.288 }, { first: 2, last: 8 });
    expect(first).toMatchObject({ trials: [6], ones: 2, zeros: 4 });
    expect(first.p[0]).toBeCloseTo(0.4, 9);
  });
});
