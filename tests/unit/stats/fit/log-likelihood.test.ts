import { lawLogLikelihood } from '$lib/stats/fit/law-log-likelihood';
import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { workspace } from '$lib/stats/fit/workspace';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf, plainLogLikelihood, probabilities, type Problem } from './plain';

const anyLevels = fc
  .record({
    rows: fc.array(
      fc.tuple(fc.double({ min: 0.01, max: 0.99, noNaN: true }), fc.integer({ min: 1, max: 8 })),
      {
        minLength: 1,
        maxLength: 4
      }
    ),
    zeros: fc.nat(3)
  })
  .map(({ rows, zeros }) => levelsOf(rows, { zeros }));

describe('logLikelihood', () => {
  it('is Σ h ln f, the tail for a lump, over the chance of n ≥ 1 when empty shots are set aside', () => {
    fc.assert(
      fc.property(
        anyLevels,
        fc.array(fc.nat(50), { minLength: 1, maxLength: 5 }),
        fc.constantFrom('plain', 'lump', 'without empty'),
        (levels, rest, kind) => {
          const p = probabilities(levels);
          const possible = levels.trials.reduce((a, b) => a + b, 0);
          const shots = [9, 1, ...rest].slice(0, possible + 1);
          const from = shots.length;
          const problem: Problem = {
            shots,
            trials: p.length,
            lump: kind === 'lump' && from <= possible ? { from, shots: 11 } : null,
            withoutEmpty: kind === 'without empty'
          };
          const got = logLikelihood(workspace(dataOf(problem)), levels);
          const want = plainLogLikelihood(problem, p);
          expect(Math.abs(got - want)).toBeLessThan(1e-10 * (1 + Math.abs(want)));
        }
      )
    );
  });

  it('sees counts far beyond the trim, and says −Infinity for impossible ones', () => {
    // One shot at 60 under Bin(60, 0.01): ln f = 60 ln 0.01.
    const data = dataOf({ shots: [...new Array<number>(60).fill(0), 1], trials: 60 });
    expect(logLikelihood(workspace(data), levelsOf([[0.01, 60]]))).toBeCloseTo(60 * Math.log(0.01), 9);
    expect(logLikelihood(workspace(data), levelsOf([[0.5, 59]], { zeros: 1 }))).toBe(-Infinity);
  });

  it('agrees with the likelihood of a law laid out whole', () => {
    const data = dataOf({ shots: [4, 9, 30, 12, 0, 2], trials: 9, lump: { from: 6, shots: 3 } });
    const levels = levelsOf(
      [
        [0.6, 2],
        [0.15, 6]
      ],
      { zeros: 1 }
    );
    expect(logLikelihood(workspace(data), levels)).toBeCloseTo(lawLogLikelihood(data, toLaw(levels)), 10);
  });
});
