import { lawLogLikelihood } from '$lib/stats/fit/law-log-likelihood';
import { landauZener } from '$lib/stats/references/landau-zener';
import { landauZenerLaw } from '$lib/stats/references/landau-zener-law';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';
import { dataOfCase, referenceCases, relative } from './reference-cases';

describe('landauZener', () => {
  it.each(referenceCases.filter((one) => one.landauZener))('agrees with SciPy: $name', (one) => {
    const found = landauZener(dataOfCase(one))!;
    expect(relative(found.logLikelihood, one.landauZener!.logLikelihood)).toBeLessThan(1e-9);
    expect(relative(found.a, one.landauZener!.a)).toBeLessThan(1e-5);
  });

  it('is not beaten on a grid of quench times', () => {
    const data = dataOf({ shots: [0, 58, 634, 1671, 1763, 733, 131, 10], trials: 32 });
    const { a, logLikelihood } = landauZener(data)!;
    let best = { a: 0, value: -Infinity };
    for (let trial = 0.5; trial < 60; trial *= 1.01) {
      const value = lawLogLikelihood(data, landauZenerLaw(32, trial));
      if (value > best.value) best = { a: trial, value };
    }
    expect(logLikelihood).toBeGreaterThanOrEqual(best.value);
    expect(Math.abs(Math.log(a / best.a))).toBeLessThan(0.01);
  });

  it('finds the quench time of counts made by it', () => {
    // 400 000 shots of N = 20, a = 3 in their expected numbers.
    const law = landauZenerLaw(20, 3);
    let f = [1];
    for (const { p, trials } of law.levels) {
      for (let t = 0; t < trials; t++) {
        f = Array.from({ length: f.length + 1 }, (_, n) => (f[n] ?? 0) * (1 - p) + (f[n - 1] ?? 0) * p);
      }
    }
    const data = dataOf({ shots: f.map((value) => Math.round(4e5 * value)), trials: 20 });
    expect(landauZener(data)!.a).toBeCloseTo(3, 3);
  });

  it.each([
    [1, 0.02],
    [1, 0.97],
    [7, 0.001],
    [7, 0.4],
    [7, 6.99],
    [64, 32],
    [64, 63.9],
    [1e6, 0.01],
    [1e6, 12],
    [1e9, 5.9],
    [1e9, 300]
  ])('finds the law of N = %d with a mean of %d', (trials, mean) => {
    // Mean of 1000 shots at the two counts beside it.
    const low = Math.floor(mean);
    const above = Math.round(1000 * (mean - low));
    const found = landauZener(
      dataOf({ shots: [...Array<number>(low).fill(0), 1000 - above, above], trials })
    )!;
    expect(found.a).toBeGreaterThan(0);
    const moments = lawMoments(landauZenerLaw(trials, found.a));
    // By likelihood, not by the mean: these counts are far narrower than the law.
    expect(Math.abs(moments.mean - mean)).toBeLessThan(0.05 * mean + 0.05);
  });

  it('is null where no best quench time is finite, or N is unknown', () => {
    expect(landauZener(dataOf({ shots: [5, 3], trials: null }))).toBeNull();
    expect(landauZener(dataOf({ shots: [5], trials: 4 }))).toBeNull();
    expect(landauZener(dataOf({ shots: [0, 0, 5], trials: 2 }))).toBeNull();
  });
});
