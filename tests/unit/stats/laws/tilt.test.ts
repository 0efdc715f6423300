import { lawMoments } from '$lib/stats/laws/law-moments';
import { tilt } from '$lib/stats/laws/tilt';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, innerProbability, lawOf } from './enumerate';

describe('tilt', () => {
  it('moves the mean of any law onto any count inside its support', () => {
    fc.assert(
      fc.property(
        fc.array(anyProbability, { minLength: 2, maxLength: 40 }),
        fc.double({ min: 0, max: 1, noNaN: true, minExcluded: true, maxExcluded: true }),
        fc.oneof(fc.constant(0), fc.double({ min: 0.01, max: 9, noNaN: true })),
        (p, share, poissonPart) => {
          const sure = p.filter((one) => one === 1).length;
          const possible = p.filter((one) => one > 0).length;
          const count = sure + share * (possible - sure);
          fc.pre(count > sure && count < possible);
          const tilted = tilt(lawOf(p, poissonPart), count)!;
          expect(Math.abs(lawMoments(tilted.law).mean - count)).toBeLessThan(1e-9 * Math.max(1, count));
          expect(tilted.exponent).toBeLessThanOrEqual(1e-12);
        }
      ),
      { numRuns: 300 }
    );
  });

  it('reaches counts of laws with probabilities down to 1e-300', () => {
    for (const p of [1e-30, 1e-120, 1e-200, 1e-300]) {
      const tilted = tilt(lawOf([p, p, p]), 1)!;
      expect(lawMoments(tilted.law).mean).toBeCloseTo(1, 9);
      // θ = ln[(1/3)/(2/3)] − ln[p/(1−p)].
      expect(tilted.theta).toBeCloseTo(-Math.log(2) - Math.log(p), 9);
    }
  });

  it('costs Λ(θ) − θ·count, here in the closed form of equal trials', () => {
    fc.assert(
      fc.property(innerProbability, fc.integer({ min: 2, max: 1000 }), fc.nat(1000), (p, trials, nth) => {
        const count = 1 + (nth % (trials - 1));
        const tilted = tilt({ levels: [{ p, trials }], poissonPart: 0 }, count)!;
        const a = count / trials;
        // −N·D(n/N ‖ p).
        const want = -trials * (a * Math.log(a / p) + (1 - a) * (Math.log1p(-a) - Math.log1p(-p)));
        expect(Math.abs(tilted.exponent - want)).toBeLessThan(1e-11 * Math.max(1, trials, Math.abs(want)));
      })
    );
  });

  it('gives null at and beyond the ends of the support', () => {
    const law = {
      levels: [
        { p: 1, trials: 2 },
        { p: 0.5, trials: 3 },
        { p: 0, trials: 4 }
      ],
      poissonPart: 0
    };
    for (const count of [-1, 0, 2, 5, 6, 9]) expect(tilt(law, count)).toBeNull();
    for (const count of [2.5, 3, 4, 4.9]) expect(tilt(law, count)).not.toBeNull();
    expect(tilt({ ...law, poissonPart: 1 }, 50)).not.toBeNull();
    expect(tilt({ ...law, poissonPart: 1 }, 2)).toBeNull();
  });
});
