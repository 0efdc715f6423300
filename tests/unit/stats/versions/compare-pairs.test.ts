import { shotsOf } from '$lib/stats/calibration/shots-of';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';
import { comparePairs } from '$lib/stats/versions/compare-pairs';
import { equalHistograms } from '$lib/stats/versions/equal-histograms';
import { describe, expect, it } from 'vitest';

/** Four versions of one group; the one at place `crossed` has variance 1.25 ceilings. */
function versions(run: number, crossed: number) {
  const random = generator(31, run);
  return [0, 1, 2, 3].map((i) => ({
    version: `v${i}`,
    histogram:
      i === crossed
        ? betaBinomial(random, 2000, 64, 0.15, 0.004)
        : shotsOf(2000, () => binomialSample(random, 64, 0.15))
  }));
}

describe('comparePairs', () => {
  it('takes every pair once, in order, and adjusts over the group or over all', async () => {
    const groups = [
      { group: 'a', versions: versions(0, -1) },
      { group: 'b', versions: versions(1, 2) }
    ];
    const options = { resamples: 199, seed: 5 };
    const each = await comparePairs(groups, options);
    const together = await comparePairs(groups, { ...options, family: 'all' });
    expect(each.tests.map(({ group, first, second }) => group + first + second).slice(0, 6)).toEqual(
      'av0v1 av0v2 av0v3 av1v2 av1v3 av2v3'.split(' ')
    );
    expect(each.tests.length).toBe(12);
    const [a, b] = groups[0].versions;
    expect(each.tests[0]).toMatchObject(equalHistograms(a.histogram, b.histogram, options));
    const smallest = (tests: typeof each.tests) => Math.min(...tests.map(({ p }) => p));
    // Holm multiplies the smallest p of a family by its size.
    for (const group of ['a', 'b']) {
      const tests = each.tests.filter((test) => test.group === group);
      const least = Math.min(...tests.map(({ pAdjusted }) => pAdjusted));
      expect(least).toBeCloseTo(Math.min(1, 6 * smallest(tests)), 12);
    }
    expect(Math.min(...together.tests.map(({ pAdjusted }) => pAdjusted))).toBeCloseTo(
      Math.min(1, 12 * smallest(together.tests)),
      12
    );
    expect(each.family).not.toBe(together.family);
  });

  it('raises any false alarm in at most 5 % of groups without a change', async () => {
    let alarms = 0;
    for (let run = 0; run < 200; run++) {
      const { tests } = await comparePairs([{ group: 'g', versions: versions(100 + run, -1) }], {
        resamples: 499,
        seed: run
      });
      if (tests.some(({ pAdjusted }) => pAdjusted <= 0.05)) alarms++;
    }
    // 10 expected at most, standard deviation 3.1.
    expect(alarms).toBeLessThanOrEqual(19);
  });

  it('refuses a version that stands twice', async () => {
    const histogram: Histogram = { kind: 'histogram', counts: [[1, 2]], lump: null };
    const twice = [{ group: 'g', versions: ['x', 'x'].map((version) => ({ version, histogram })) }];
    await expect(comparePairs(twice, { resamples: 99, seed: 1 })).rejects.toThrow('twice in group g');
  });
});
