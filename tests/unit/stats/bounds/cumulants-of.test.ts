import { cumulantsOf } from '$lib/stats/bounds/cumulants-of';
import { powerSums } from '$lib/stats/bounds/power-sums';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addTrials } from './trials';

describe('cumulantsOf', () => {
  it('agrees with cumulants of the enumerated pmf', () => {
    const p = [0.1, 0.6, 0.7, 0.8];
    const pmf = addTrials(p);
    const mean = pmf.reduce((sum, f, n) => sum + n * f, 0);
    const about = (r: number) => pmf.reduce((sum, f, n) => sum + (n - mean) ** r * f, 0);
    const [s1, s2, s3, s4] = [1, 2, 3, 4].map((r) => p.reduce((sum, q) => sum + q ** r, 0));
    const cumulants = cumulantsOf({ s1, s2, s3, s4 });
    expect(cumulants.mean).toBeCloseTo(mean, 13);
    expect(cumulants.variance).toBeCloseTo(about(2), 13);
    expect(cumulants.third).toBeCloseTo(about(3), 13);
    expect(cumulants.fourth).toBeCloseTo(about(4) - 3 * about(2) ** 2, 13);
  });

  it('undoes powerSums', () => {
    const any = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(any, any, any, any, (mean, variance, third, fourth) => {
        const back = cumulantsOf(powerSums({ mean, variance, third, fourth }));
        expect(back.mean).toBe(mean);
        expect(back.variance).toBeCloseTo(variance, 11);
        expect(back.third).toBeCloseTo(third, 11);
        expect(back.fourth).toBeCloseTo(fourth, 10);
      })
    );
  });
});
