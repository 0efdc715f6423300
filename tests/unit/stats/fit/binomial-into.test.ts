import { binomialInto } from '$lib/stats/fit/binomial-into';
import { workspace } from '$lib/stats/fit/workspace';
import { binomialWindow } from '$lib/stats/laws/binomial-window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { innerProbability } from '../laws/enumerate';
import { dataOf } from './plain';

describe('binomialInto', () => {
  it('equals binomialWindow with the same trim, into buffers used again', () => {
    const space = workspace(dataOf({ shots: [1, 1], trials: null }));
    fc.assert(
      fc.property(innerProbability, fc.integer({ min: 1, max: 20_000 }), (p, trials) => {
        const [first, length] = binomialInto(space, trials, p, 1e-20);
        const want = binomialWindow(trials, p, 1e-20, 1);
        let total = 0;
        for (let k = 0; k < length; k++) {
          total += space.part[k];
          const value = want.values[first + k - want.first] ?? 0;
          expect(Math.abs(space.part[k] - value)).toBeLessThan(1e-12 * Math.max(value, 1e-18));
        }
        expect(total).toBeCloseTo(1, 12);
        expect(first).toBeLessThanOrEqual(want.first + 1);
      }),
      { numRuns: 60 }
    );
  });
});
