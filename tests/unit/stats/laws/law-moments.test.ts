import { cumulantsOf } from '$lib/stats/bounds/cumulants-of';
import { lawMoments } from '$lib/stats/laws/law-moments';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, enumerate, lawOf } from './enumerate';

/** Cumulants from central moments of a pmf: the definition. */
function fromPmf(pmf: number[]) {
  const central = (r: number, about: number) => pmf.reduce((sum, f, n) => sum + f * (n - about) ** r, 0);
  const mean = central(1, 0);
  const variance = central(2, mean);
  return { mean, variance, third: central(3, mean), fourth: central(4, mean) - 3 * variance ** 2 };
}

describe('lawMoments', () => {
  it('are the cumulants of the law, by enumeration', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 9 }), (p) => {
        const got = lawMoments(lawOf(p));
        const want = fromPmf(enumerate(p));
        for (const name of ['mean', 'variance', 'third', 'fourth'] as const) {
          expect(Math.abs(got[name] - want[name]), name).toBeLessThan(1e-11);
        }
      })
    );
  });

  it('agree with the power-sum form κ4 = s1 − 7s2 + 12s3 − 6s4, a Poisson part added to each', () => {
    fc.assert(
      fc.property(
        fc.array(anyProbability, { maxLength: 50 }),
        fc.double({ min: 0, max: 20, noNaN: true }),
        (p, poissonPart) => {
          const [s1, s2, s3, s4] = [1, 2, 3, 4].map((r) => p.reduce((sum, one) => sum + one ** r, 0));
          const want = cumulantsOf({ s1, s2, s3, s4 });
          const got = lawMoments(lawOf(p, poissonPart));
          for (const name of ['mean', 'variance', 'third', 'fourth'] as const) {
            expect(Math.abs(got[name] - want[name] - poissonPart), name).toBeLessThan(1e-11);
          }
        }
      )
    );
  });

  it('gives the hard-core gas of 20 sites its mean 5.680650 and variance 1.887740', () => {
    // p_k = s/(1+s), s = 4cos²(πk/22), k = 1 … 10: zeros of the independence polynomial of a path of 20
    // (values computed with mpmath from the closed form).
    const p = Array.from({ length: 10 }, (_, k) => {
      const s = 4 * Math.cos((Math.PI * (k + 1)) / 22) ** 2;
      return s / (1 + s);
    });
    expect(lawMoments(lawOf(p)).mean).toBeCloseTo(5.68065, 6);
    expect(lawMoments(lawOf(p)).variance).toBeCloseTo(1.88774, 6);
  });
});
