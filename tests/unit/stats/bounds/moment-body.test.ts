import { momentBody } from '$lib/stats/bounds/moment-body';
import { powerSums } from '$lib/stats/bounds/power-sums';
import { lawMoments } from '$lib/stats/laws/law-moments';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** The three determinants as they stand in the definition (second algorithm). */
function determinants(trials: number, mean: number, variance: number, third: number): number[] {
  const { s1, s2, s3 } = powerSums({ mean, variance, third, fourth: 0 });
  return [trials * s2 - s1 * s1, s1 * s3 - s2 * s2, (trials - s1) * (s2 - s3) - (s1 - s2) ** 2];
}

describe('momentBody', () => {
  it('holds for any trials, with N and without', () => {
    const share = fc.oneof(fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom(0, 1));
    fc.assert(
      fc.property(
        fc.array(share, { minLength: 1, maxLength: 20 }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        (p, poissonPart) => {
          const levels = p.map((q) => ({ p: q, trials: 1 }));
          const known = momentBody(p.length, lawMoments({ levels, poissonPart: 0 }));
          const unknown = momentBody(null, lawMoments({ levels, poissonPart }));
          expect([...known, ...unknown].filter((condition) => !condition.holds)).toEqual([]);
        }
      ),
      { numRuns: 500 }
    );
  });

  it('holds where rounding takes the mean to N before the variance to 0', () => {
    const levels = [1, 0.9999999999999994, 1, 1, 1].map((p) => ({ p, trials: 1 }));
    const moments = lawMoments({ levels, poissonPart: 0 });
    expect([moments.mean, moments.variance > 0]).toEqual([5, true]);
    expect(momentBody(5, moments).every(({ holds }) => holds)).toBe(true);
  });

  it('agrees in sign with the determinants', () => {
    const trials = 12;
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 11.5, noNaN: true }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        fc.double({ min: -4, max: 6, noNaN: true }),
        (mean, variance, third) => {
          const slacks = momentBody(trials, { mean, variance, third }).map((condition) => condition.slack);
          determinants(trials, mean, variance, third).forEach((determinant, i) => {
            if (Math.abs(determinant) > 1e-9) expect(Math.sign(slacks[i])).toBe(Math.sign(determinant));
          });
        }
      )
    );
  });

  it('is met with equality by equal trials, and broken beside them', () => {
    const p = 0.15;
    const mean = 64 * p;
    const variance = mean * (1 - p);
    const third = variance * (1 - 2 * p);
    for (const condition of momentBody(64, { mean, variance, third })) {
      expect(condition.slack).toBeCloseTo(0, 12);
      expect(condition.holds).toBe(true);
    }
    expect(momentBody(64, { mean, variance: variance * 1.05, third })[0].holds).toBe(false);
    expect(momentBody(64, { mean, variance, third: third - 0.1 })[1].holds).toBe(false);
    expect(momentBody(64, { mean, variance, third: third + 0.1 })[2].holds).toBe(false);
    expect(momentBody(64, { mean, variance: variance * 1.05, third })[0].slack).toBeCloseTo(
      -0.05 * variance,
      12
    );
  });

  it('answers at the corners', () => {
    const corner = (trials: number | null, mean: number, variance: number, third: number) =>
      momentBody(trials, { mean, variance, third }).map((condition) => condition.holds);
    expect(corner(5, 0, 0, 0)).toEqual([true, true, true]);
    expect(corner(5, 5, 0, 0)).toEqual([true, true, true]);
    expect(corner(null, 2, 2, 2)).toEqual([true, true, true]);
    expect(corner(5, 6, 1, 1)).toContain(false);
    expect(corner(5, -1, 1, 1)).toContain(false);
    expect(corner(5, 2, -0.1, 0)).toContain(false);
    expect(corner(5, 0, 1, 1)).toContain(false);
  });
});
