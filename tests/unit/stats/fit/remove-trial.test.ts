import { removeTrial } from '$lib/stats/fit/remove-trial';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { innerProbability } from '../laws/enumerate';
import { plainPmf } from './plain';

describe('removeTrial', () => {
  it('undoes the adding of a trial, upward for p ≤ ½ and downward beyond', () => {
    fc.assert(
      fc.property(
        fc.array(innerProbability, { minLength: 1, maxLength: 60 }),
        fc.oneof(innerProbability, fc.constantFrom(0, 1, 0.5)),
        (rest, p) => {
          const f = Float64Array.from(plainPmf([...rest, p]));
          const g = new Float64Array(f.length + 5).fill(7);
          removeTrial(f, f.length, p, g);
          const want = plainPmf(rest);
          const largest = Math.max(...want);
          // Errors do not grow from step to step, so they stay at rounding of the largest value.
          want.forEach((value, n) => expect(Math.abs(g[n] - value)).toBeLessThan(1e-13 * largest));
          expect(Math.abs(g[rest.length + 1])).toBeLessThan(1e-13 * largest);
        }
      )
    );
  });

  it('keeps that twice over, all that a fit asks, for 400 trials', () => {
    for (const p of [0.01, 0.3, 0.5, 0.8]) {
      let f = Float64Array.from(plainPmf(new Array<number>(400).fill(p)));
      for (let removed = 0; removed < 2; removed++) {
        const g = new Float64Array(f.length);
        removeTrial(f, f.length, p, g);
        f = g;
      }
      const want = plainPmf(new Array<number>(398).fill(p));
      const largest = Math.max(...want);
      want.forEach((value, n) => expect(Math.abs(f[n] - value)).toBeLessThan(1e-11 * largest));
    }
  });
});
