import { pLimits } from '$lib/stats/claim/p-limits';
import { describe, expect, it } from 'vitest';

const resampled = { source: 'resampled' as const, stoppedEarly: false };

describe('pLimits', () => {
  it('are Clopper–Pearson limits of the draws that were as extreme', () => {
    // Issue's table of checks, exact: 1 of 10 gives .0025286 – .445016; p = (1 + 1)/(10 + 1).
    const found = pLimits({ ...resampled, p: 2 / 11, resamples: 10 });
    expect(found.low).toBeCloseTo(0.0025286, 7);
    expect(found.high).toBeCloseTo(0.445016, 6);
    // 0 of 10: 0 – .308497.
    expect(pLimits({ ...resampled, p: 1 / 11, resamples: 10 })).toMatchObject({ low: 0 });
    expect(pLimits({ ...resampled, p: 1 / 11, resamples: 10 }).high).toBeCloseTo(0.308497, 6);
  });

  it('hold p itself even with no more than a few draws', () => {
    for (const resamples of [1, 2, 9, 99])
      for (let k = 0; k <= resamples; k++) {
        const p = (k + 1) / (resamples + 1);
        const { low, high } = pLimits({ ...resampled, p, resamples });
        expect(low).toBeLessThanOrEqual(p);
        expect(high).toBeGreaterThanOrEqual(p);
      }
  });

  it('of a run that ended at its hundredth are those of a Poisson count of 100', () => {
    // Garwood 1936 for 100: R 4.2, qchisq(c(.025, .975), c(200, 202))/2 = 81.36395 and 121.6270.
    const found = pLimits({ source: 'resampled', p: 0.25, resamples: 400, stoppedEarly: true });
    expect(found.low).toBeCloseTo(81.36395 / 400, 6);
    expect(found.high).toBeCloseTo(121.627 / 400, 5);
  });

  it('leave an exact p as it is', () => {
    const one = { value: 0.3, low: 0.3, high: 0.3 };
    expect(pLimits({ source: 'exact', p: 0.3, resamples: 0, stoppedEarly: false })).toEqual(one);
    expect(pLimits({ source: 'limit', p: 0.3, resamples: 0, stoppedEarly: false })).toEqual(one);
  });
});
