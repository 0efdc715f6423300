import { bestLaw } from '$lib/stats/fit/best-law';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { fitReport } from '$lib/stats/fit-report/fit-report';
import { floorLaw } from '$lib/stats/floor/floor-law';
import { fittedTests } from '$lib/stats/resampling/fitted-tests';
import { unbroken } from '$lib/stats/resampling/pace';
import { describe, expect, it } from 'vitest';
import { dataOf, plainLogLikelihood, plainPmf, type Problem } from '../fit/plain';

async function report(problem: Problem, alpha = 0.01) {
  const counts = dataOf(problem);
  const best = bestLaw(counts);
  const fitted = await fittedTests(counts, best, { resamples: 99, seed: 1 }, unbroken);
  const law = toLaw(best.levels);
  return fitReport({ counts, best, law, floor: floorLaw(counts), fitted, supplied: null, alpha });
}

/** Half and half of two binomials of N = 12: far from every independent-trial law. */
const mixed = plainPmf(new Array<number>(12).fill(0.15)).map((f, n) =>
  Math.round(2500 * (f + plainPmf(new Array<number>(12).fill(0.5))[n]))
);

describe('fitReport', () => {
  it('ties its numbers together: G² = 2SD, floor ≤ D, likelihood of the levels it lists', async () => {
    const fit = await report({ shots: mixed, trials: 12 });
    const total = mixed.reduce((a, b) => a + b, 0);
    const p = fit.levels.flatMap(({ p: one, trials }) => new Array<number>(trials).fill(one));
    expect(p).toHaveLength(12);
    expect(fit.logLikelihood).toBeCloseTo(plainLogLikelihood({ shots: mixed, trials: 12 }, p), 6);
    expect(fit.gSquared).toBeCloseTo(2 * total * fit.divergence, 9);
    expect(fit.floor).toBeLessThanOrEqual(fit.divergence);
    expect(fit.divergenceCorrected).toBeLessThan(fit.divergence);
  });

  it('says that about ln(1/α)/D shots make the divergence noticeable', async () => {
    const fit = await report({ shots: mixed, trials: 12 });
    expect(fit.divergenceInterval.low).toBeGreaterThan(0);
    expect(fit.shotsToNotice).toBe(Math.ceil(Math.log(100) / fit.divergenceCorrected!));
    const stricter = await report({ shots: mixed, trials: 12 }, 1e-4);
    expect(stricter.shotsToNotice!).toBeGreaterThan(1.9 * fit.shotsToNotice!);
  });

  it('promises no number of shots where there may be nothing to notice', async () => {
    const equal = plainPmf(new Array<number>(12).fill(0.3)).map((f) => Math.round(500 * f));
    const fit = await report({ shots: equal, trials: 12 });
    expect(fit.divergenceInterval.low).toBe(0);
    expect(fit.shotsToNotice).toBeNull();
  });

  it('is certified for counts that are exactly those of independent trials', async () => {
    const shots = plainPmf([0.1, 0.5, 0.5, 0.9]).map((f) => Math.round(1e6 * f));
    const fit = await report({ shots, trials: 4 });
    expect(fit.certified).toBe(true);
    expect(fit.divergence).toBeLessThan(1e-8);
  });

  it('has no correction where nothing could be resampled', async () => {
    const fit = await report({ shots: [0, 0, 30], trials: 5 });
    expect(fit).toMatchObject({ divergence: 0, divergenceCorrected: null, shotsToNotice: null });
    expect(fit.divergenceInterval).toEqual({ value: null, low: null, high: null });
  });
});
