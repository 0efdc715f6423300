import { sampleMoments } from '$lib/stats/fit/sample-moments';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf } from './plain';

describe('sampleMoments', () => {
  it('gives mean and central moments over S, a lump as its first count', () => {
    // Counts 1, 1, 2, 4: mean 2, deviations −1, −1, 0, 2.
    const want = { mean: 2, variance: 6 / 4, third: 6 / 4 };
    expect(sampleMoments(dataOf({ shots: [0, 2, 1, 0, 1], trials: 5 }))).toEqual(want);
    expect(sampleMoments(dataOf({ shots: [0, 2, 1], trials: 5, lump: { from: 4, shots: 1 } }))).toEqual(want);
  });

  it('gives Weldon’s dice the mean 4.052383', () => {
    // Pearson 1900, Phil. Mag. 50:157: mean of the 26306 throws, recomputed from the printed table.
    const shots = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0];
    expect(sampleMoments(dataOf({ shots, trials: 12 })).mean).toBeCloseTo(4.052383, 6);
  });

  it('does not change its central moments when every count is shifted', () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(1000), { minLength: 1, maxLength: 12 }),
        fc.integer({ min: 1, max: 60 }),
        (tail, by) => {
          const shots = [1, ...tail];
          const here = sampleMoments(dataOf({ shots, trials: null }));
          const there = sampleMoments(
            dataOf({ shots: [...new Array<number>(by).fill(0), ...shots], trials: null })
          );
          expect(there.mean - here.mean).toBeCloseTo(by, 9);
          expect(there.variance).toBeCloseTo(here.variance, 8);
          expect(there.third).toBeCloseTo(here.third, 6);
        }
      )
    );
  });
});
