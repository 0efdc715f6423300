import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { floorLaw } from '$lib/stats/floor/floor-law';
import { lawWindow } from '$lib/stats/laws/law-window';
import { divergence } from '$lib/stats/resampling/divergence';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

function data(shots: number[], trials: number | null) {
  return fitData({ kind: 'histogram', counts: shots.map((h, n) => [n, h]), lump: null }, trials);
}

/**
 * On three counts with N = 2 there is one inequality, f_1² ≥ 4 f_0 f_2. Where the data obey it the floor is 0; else the
 * maximum lies on its edge, and the edge is the binomials, whose best has the sample mean.
 */
function closedForm([a, b, c]: number[]): number {
  if (b * b >= 4 * a * c) return 0;
  const total = a + b + c;
  const p = (b + 2 * c) / (2 * total);
  const law = [(1 - p) ** 2, 2 * p * (1 - p), p * p];
  return [a, b, c].reduce((sum, h, n) => sum + (h / total) * Math.log(h / total / law[n]), 0);
}

describe('floorLaw', () => {
  it('is 0.000215 for Weldon’s dice (recomputed with SciPy for the counting science)', () => {
    const weldon = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4];
    expect(floorLaw(data(weldon, 12)).divergence).toBeCloseTo(0.000215, 6);
  });

  it('is nothing for a histogram that obeys Newton’s inequalities', () => {
    const { values } = lawWindow(
      {
        levels: [
          { p: 0.3, trials: 4 },
          { p: 0.7, trials: 3 }
        ],
        poissonPart: 0
      },
      0,
      1
    );
    const found = floorLaw(
      data(
        [...values].map((p) => p * 1e6),
        7
      )
    );
    expect(found.divergence).toBeLessThan(1e-12);
  });

  it('refuses (1, 4, 6)/11 as log-concave but not under Newton’s inequalities', () => {
    const shots = [1, 4, 6];
    const found = floorLaw(data(shots, 2)).divergence;
    expect(found).toBeGreaterThan(1e-4);
    expect(found).toBeCloseTo(closedForm(shots), 10);
  });

  it('agrees with the closed form on three counts, whatever they are', () => {
    fc.assert(
      fc.property(
        fc.tuple(
          fc.integer({ min: 1, max: 90 }),
          fc.integer({ min: 1, max: 90 }),
          fc.integer({ min: 1, max: 90 })
        ),
        (shots) => {
          expect(Math.abs(floorLaw(data(shots, 2)).divergence - closedForm(shots))).toBeLessThan(1e-9);
        }
      ),
      { numRuns: 300, seed: 3 }
    );
  });

  it('lies at or below the best law, with a concave ℓ that sums to 1', () => {
    const rows = fc
      .array(fc.nat(60), { minLength: 3, maxLength: 9 })
      .filter((h) => h.filter((x) => x > 0).length > 1);
    fc.assert(
      fc.property(rows, fc.constantFrom(null, 12), (shots, trials) => {
        const counts = data(shots, trials);
        const floor = floorLaw(counts);
        const best = divergence(counts, bestLaw(counts).logLikelihood);
        expect(floor.divergence).toBeLessThanOrEqual(best + 1e-9);
        const f = floor.logProbabilities.map(Math.exp);
        expect(f.reduce((sum, p) => sum + p, 0)).toBeCloseTo(1, 9);
        for (let i = 1; i + 1 < f.length; i++) {
          const n = counts.first + i;
          const room = trials === null ? 1 + 1 / n : (1 + 1 / n) * (1 + 1 / (trials - n));
          expect(f[i] ** 2).toBeGreaterThanOrEqual(f[i - 1] * f[i + 1] * room * (1 - 1e-7));
        }
      }),
      { numRuns: 60, seed: 11 }
    );
  });
});
