import { bestLaw } from '$lib/stats/fit/best-law';
import { referenceLaws } from '$lib/stats/references/reference-laws';
import { saturated } from '$lib/stats/resampling/divergence';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf, plainLogLikelihood } from '../fit/plain';

const shots = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4];

describe('referenceLaws', () => {
  it('lists all five for a known N and a supplied law, with AIC = 2·parameters − 2·log-likelihood', () => {
    const supplied = new Array<number>(12).fill(1 / 3);
    const { references, omitted } = referenceLaws(dataOf({ shots, trials: 12 }), supplied);
    expect(omitted).toEqual([]);
    const parameters = { 'equal-trials': 1, 'rare-events': 1, gaussian: 2, 'landau-zener': 1, supplied: 0 };
    expect(references.map(({ id }) => id)).toEqual(Object.keys(parameters));
    for (const { id, aic, logLikelihood, divergence } of references) {
      expect(aic).toBeCloseTo(2 * parameters[id] - 2 * logLikelihood, 9);
      const data = dataOf({ shots, trials: 12 });
      expect(divergence).toBeCloseTo((saturated(data) - logLikelihood) / 26306, 12);
    }
    const fair = references.find(({ id }) => id === 'supplied')!;
    expect(fair.logLikelihood).toBeCloseTo(plainLogLikelihood({ shots, trials: 12 }, supplied), 6);
    expect(fair.parameters).toEqual({});
  });

  it('leaves out what it cannot fit, with the reason', () => {
    const reasons = (data: ReturnType<typeof dataOf>, supplied: number[] | null = null) =>
      Object.fromEntries(referenceLaws(data, supplied).omitted.map(({ id, reason }) => [id, reason]));
    const unknown = reasons(dataOf({ shots, trials: null }));
    expect(unknown['equal-trials']).toMatch(/number of trials/);
    expect(unknown['landau-zener']).toMatch(/number of modes/);
    expect(unknown.supplied).toMatch(/No law/);
    expect(reasons(dataOf({ shots: [0, 9], trials: 2 })).gaussian).toMatch(/same count/);
    // A supplied law that forbids a count that was seen.
    expect(reasons(dataOf({ shots: [1, 1, 1], trials: 2 }), [0, 0.5]).supplied).toMatch(/no probability/);
  });

  it('never does better than the best law does, as far as it is one of the family', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 0, max: 300 }), { minLength: 3, maxLength: 9 }), (random) => {
        fc.pre(random.filter((h) => h > 0).length > 1);
        const data = dataOf({ shots: random, trials: random.length + 2 });
        const best = bestLaw(data).logLikelihood;
        for (const { id, logLikelihood } of referenceLaws(data, null).references) {
          if (id === 'equal-trials' || id === 'landau-zener') expect(logLikelihood).toBeLessThan(best + 1e-3);
          expect(logLikelihood).toBeLessThan(saturated(data) + 1e-9);
        }
      }),
      { numRuns: 30 }
    );
  });
});
