import { powerSums } from '$lib/stats/bounds/power-sums';
import { lawMoments } from '$lib/stats/laws/law-moments';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const share = fc.double({ min: 0, max: 1, noNaN: true });

describe('powerSums', () => {
  it('recovers Σp^r from the cumulants of trials', () => {
    fc.assert(
      fc.property(fc.array(share, { minLength: 1, maxLength: 20 }), (p) => {
        const cumulants = lawMoments({ levels: p.map((q) => ({ p: q, trials: 1 })), poissonPart: 0 });
        const sums = powerSums(cumulants);
        const want = [1, 2, 3, 4].map((r) => p.reduce((sum, q) => sum + q ** r, 0));
        [sums.s1, sums.s2, sums.s3, sums.s4].forEach((s, i) => expect(s).toBeCloseTo(want[i], 11));
      })
    );
  });

  it('gives a Poisson count to s1 alone', () => {
    expect(powerSums({ mean: 3, variance: 3, third: 3, fourth: 3 })).toEqual({ s1: 3, s2: 0, s3: 0, s4: 0 });
  });
});
