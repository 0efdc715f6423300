import { gaussian } from '$lib/stats/references/gaussian';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';
import { dataOfCase, referenceCases, relative } from './reference-cases';

describe('gaussian', () => {
  it.each(referenceCases)('agrees with SciPy: $name', (one) => {
    const { logLikelihood, mean, variance } = gaussian(dataOfCase(one))!;
    expect(relative(mean, one.mean)).toBeLessThan(1e-12);
    expect(relative(variance, one.variance)).toBeLessThan(1e-12);
    expect(relative(logLikelihood, one.gaussian)).toBeLessThan(1e-10);
  });

  it('is finite for a count forty widths away, and null without a width', () => {
    const far = dataOf({ shots: [5000, 5000, ...new Array<number>(40).fill(0), 1], trials: null });
    const { logLikelihood } = gaussian(far)!;
    expect(Number.isFinite(logLikelihood)).toBe(true);
    expect(logLikelihood).toBeLessThan(-1000);
    expect(gaussian(dataOf({ shots: [0, 7], trials: 3 }))).toBeNull();
  });
});
