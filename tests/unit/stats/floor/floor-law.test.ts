import { newtonViolation } from '$lib/stats/bounds/newton-violation';
import { bestLaw } from '$lib/stats/fit/best-law';
import { floorLaw } from '$lib/stats/floor/floor-law';
import { saturated } from '$lib/stats/resampling/divergence';
import fc from 'fast-check';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { dataOf, plainPmf } from '../fit/plain';

/** fixtures/reference/floor.py: the same problem by SciPy, in another form. */
const { cases } = JSON.parse(
  readFileSync(new URL('../../../../fixtures/reference/floor.json', import.meta.url), 'utf8')
) as { cases: { shots: number[]; trials: number | null; divergence: number }[] };

const anyShots = fc.array(fc.oneof(fc.nat(5), fc.nat(2000)), { minLength: 2, maxLength: 12 });
const seen = (shots: number[]) => shots.filter((h) => h > 0).length;

describe('floorLaw', () => {
  it('agrees with a general-purpose solver to 1e-8 nats', () => {
    expect(cases.length).toBeGreaterThan(30);
    for (const { shots, trials, divergence } of cases) {
      const floor = floorLaw(dataOf({ shots, trials }));
      expect(Math.abs(floor.divergence - divergence), `${shots} of ${trials}`).toBeLessThan(1e-8);
    }
  });

  it('gives Weldon’s dice 0.000215', () => {
    const shots = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0];
    expect(floorLaw(dataOf({ shots, trials: 12 })).divergence).toBeCloseTo(0.000215, 6);
  });

  it('never lies above the best law found: no independent trials come closer', () => {
    fc.assert(
      fc.property(anyShots, fc.option(fc.nat(8)), (shots, more) => {
        fc.pre(seen(shots) > 1);
        const trials = more === null ? null : shots.length - 1 + more;
        const data = dataOf({ shots, trials });
        const best = (saturated(data) - bestLaw(data).logLikelihood) / data.total;
        const floor = floorLaw(data).divergence;
        expect(floor).toBeGreaterThanOrEqual(0);
        expect(floor).toBeLessThan(best + 1e-9);
      }),
      { numRuns: 60 }
    );
  });

  it('never lies above the best law found with a lump', () => {
    fc.assert(
      fc.property(anyShots, fc.integer({ min: 1, max: 400 }), fc.nat(3), (shots, many, gap) => {
        fc.pre(seen(shots) > 0);
        const from = shots.length + gap;
        const data = dataOf({ shots, trials: from + 2, lump: { from, shots: many } });
        const best = (saturated(data) - bestLaw(data).logLikelihood) / data.total;
        expect(floorLaw(data).divergence).toBeLessThan(best + 1e-9);
      }),
      { numRuns: 40 }
    );
  });

  it('returns a law: it sums to 1, obeys Newton’s inequalities, and has the divergence stated', () => {
    fc.assert(
      fc.property(anyShots, fc.option(fc.nat(8)), (shots, more) => {
        fc.pre(seen(shots) > 1);
        const trials = more === null ? null : shots.length - 1 + more;
        const data = dataOf({ shots, trials });
        const { logProbabilities, divergence } = floorLaw(data);
        const f = Array.from(logProbabilities, Math.exp);
        expect(f.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 12);
        const pmf = [...new Array<number>(data.first).fill(0), ...f];
        expect(newtonViolation(pmf, trials)?.excess ?? 0).toBeLessThan(1e-9);
        let kl = 0;
        data.shots.forEach((h, i) => {
          if (h > 0) kl += (h / data.total) * (Math.log(h / data.total) - logProbabilities[i]);
        });
        expect(Math.abs(kl - divergence)).toBeLessThan(1e-12);
      }),
      { numRuns: 100 }
    );
  });

  it('is 0 for counts that obey Newton’s inequalities themselves', () => {
    // Exact proportions of a Poisson-binomial law: probabilities are multiples of 1e-5.
    const shots = plainPmf([0.1, 0.2, 0.5, 0.5, 0.9]).map((f) => Math.round(f * 1e5));
    expect(newtonViolation(shots, 5)!.excess).toBeLessThan(0);
    expect(floorLaw(dataOf({ shots, trials: 5 })).divergence).toBeLessThan(1e-9);
    expect(floorLaw(dataOf({ shots: [36, 48, 16], trials: 2 })).divergence).toBeLessThan(1e-9);
  });

  it('is the binomial law where two trials break the inequality: (1, 4, 6)/11', () => {
    // f1² ≥ 4 f0 f2 is met with equality on the binomial laws, and p = 16/22 has the mean of the data.
    const p = 16 / 22;
    const f = [(1 - p) ** 2, 2 * p * (1 - p), p * p];
    const want = [1, 4, 6].reduce((sum, h, n) => sum + (h / 11) * Math.log(h / 11 / f[n]), 0);
    expect(floorLaw(dataOf({ shots: [1, 4, 6], trials: 2 })).divergence).toBeCloseTo(want, 9);
  });

  it('has nothing to say of one count, or of a lump alone', () => {
    expect(floorLaw(dataOf({ shots: [0, 0, 9], trials: 4 })).divergence).toBe(0);
    expect(floorLaw(dataOf({ shots: [], trials: 4, lump: { from: 2, shots: 9 } })).divergence).toBe(0);
  });

  it('reaches the global floor on broad counts as well', () => {
    // 400 counts, twice binomial: the slack says how near the end is.
    const half = (p: number) => plainPmf(new Array<number>(400).fill(p));
    const [a, b] = [half(0.3), half(0.36)];
    const shots = a.map((f, n) => Math.round(20_000 * (f + b[n])));
    const floor = floorLaw(dataOf({ shots, trials: 400 }));
    expect(floor.slack).toBeLessThan(1e-7);
    expect(floor.divergence).toBeGreaterThan(0.01);
  });
});
