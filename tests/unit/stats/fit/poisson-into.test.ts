import { poissonInto } from '$lib/stats/fit/poisson-into';
import { workspace } from '$lib/stats/fit/workspace';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf } from './plain';

describe('poissonInto', () => {
  it('is the Poisson pmf, ends under the trim of its mode left out', () => {
    const space = workspace(dataOf({ shots: [1, 1], trials: null }));
    fc.assert(
      fc.property(
        fc.oneof(
          fc.double({ min: 1e-9, max: 10, noNaN: true }),
          fc.double({ min: 1, max: 1e5, noNaN: true })
        ),
        (mean) => {
          const [first, length] = poissonInto(space, mean, 1e-20);
          let total = 0;
          for (let k = 0; k < length; k++) {
            total += space.part[k];
            const want = Math.exp(logPoissonPmf(first + k, mean));
            expect(Math.abs(space.part[k] / want - 1)).toBeLessThan(1e-10);
          }
          expect(total).toBeCloseTo(1, 12);
        }
      ),
      { numRuns: 60 }
    );
  });
});
