import { lawLogLikelihood } from '$lib/stats/fit/law-log-likelihood';
import { landauZener } from '$lib/stats/references/landau-zener';
import { landauZenerLaw } from '$lib/stats/references/landau-zener-law';
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

  it('is null where no best quench time is finite, or N is unknown', () => {
    expect(landauZener(dataOf({ shots: [5, 3], trials: null }))).toBeNull();
    expect(landauZener(dataOf({ shots: [5], trials: 4 }))).toBeNull();
    expect(landauZener(dataOf({ shots: [0, 0, 5], trials: 2 }))).toBeNull();
  });
});
