import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { workspace } from '$lib/stats/fit/workspace';
import { divergence, saturated } from '$lib/stats/resampling/divergence';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf } from '../fit/plain';

describe('divergence', () => {
  it('is Σ p̂ ln(p̂/f), by hand', () => {
    // p̂ = (½, ½) against f = (¼, ½, ¼): ½ ln 2 + ½ ln 1.
    const data = dataOf({ shots: [5, 5], trials: 2 });
    const fair = logLikelihood(workspace(data), levelsOf([[0.5, 2]]));
    expect(divergence(data, fair)).toBeCloseTo(0.5 * Math.LN2, 13);
  });

  it('takes a lump as one cell', () => {
    const data = dataOf({ shots: [5], trials: 2, lump: { from: 1, shots: 15 } });
    expect(saturated(data)).toBeCloseTo(5 * Math.log(0.25) + 15 * Math.log(0.75), 12);
    expect(divergence(data, logLikelihood(workspace(data), levelsOf([[0.5, 2]])))).toBeCloseTo(0, 13);
  });

  it('is never below 0, and 0 for a law that repeats the data', () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(1000), { minLength: 4, maxLength: 4 }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        (shots, p) => {
          fc.pre(shots.some((h) => h > 0));
          const data = dataOf({ shots, trials: 3 });
          const value = logLikelihood(workspace(data), levelsOf([[p, 3]]));
          expect(divergence(data, value)).toBeGreaterThanOrEqual(0);
          expect(divergence(data, saturated(data))).toBe(0);
          // Gibbs: no law has a greater likelihood than the data give themselves.
          expect(value).toBeLessThan(saturated(data) + 1e-9);
        }
      )
    );
  });
});
