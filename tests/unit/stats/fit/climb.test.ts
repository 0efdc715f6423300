import { climb } from '$lib/stats/fit/climb';
import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { slopes } from '$lib/stats/fit/slopes';
import { workspace } from '$lib/stats/fit/workspace';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf } from './plain';

describe('climb', () => {
  it('comes to where the slope in every angle is nothing, and never loses', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 1, max: 300 }), { minLength: 7, maxLength: 7 }),
        fc.array(fc.double({ min: 0.02, max: 0.98, noNaN: true }), { minLength: 2, maxLength: 2 }),
        (shots, [a, b]) => {
          const space = workspace(dataOf({ shots, trials: 6 }));
          const start = levelsOf([
            [a, 2],
            [b, 4]
          ]);
          const before = logLikelihood(space, start);
          const { levels, value } = climb(space, start, 1e-12);
          expect(value).toBeGreaterThanOrEqual(before);
          expect(logLikelihood(space, levels)).toBeCloseTo(value, 9);
          const { gradient } = slopes(space, levels);
          levels.p.forEach((p, j) => {
            const inAngle = gradient[j] * 2 * Math.sqrt(p * (1 - p));
            // A step of size g/curvature would gain g²/(2·curvature): under 1e-5 of what one shot weighs.
            expect(Math.abs(inAngle)).toBeLessThan(0.05);
          });
        }
      ),
      { numRuns: 100 }
    );
  });

  it('absorbs levels that come to 0 and 1, and merges levels that meet', () => {
    // Exactly the law of one sure trial and two at one half, in its own proportions.
    const space = workspace(dataOf({ shots: [0, 2500, 5000, 2500], trials: 4 }));
    const { levels } = climb(
      space,
      levelsOf([
        [0.9, 1],
        [0.6, 1],
        [0.45, 1],
        [0.05, 1]
      ]),
      1e-12
    );
    expect(levels).toMatchObject({ trials: [2], ones: 1, zeros: 1 });
    expect(levels.p[0]).toBeCloseTo(0.5, 6);
  });

  it('gives up when the bar is out of reach', () => {
    const space = workspace(dataOf({ shots: [30, 50, 45, 12], trials: 3 }));
    const start = levelsOf([[0.2, 3]]);
    const whole = climb(space, start, 1e-12);
    expect(climb(space, start, 1e-12, 0).steps).toBeLessThan(whole.steps);
  });
});
