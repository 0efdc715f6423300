import { equalTrials } from '$lib/stats/references/equal-trials';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';
import { dataOfCase, referenceCases, relative } from './reference-cases';

describe('equalTrials', () => {
  it.each(referenceCases)('agrees with SciPy: $name', (one) => {
    const data = dataOfCase(one);
    if (one.equal) {
      const { logLikelihood, parameter } = equalTrials(data, one.trials);
      expect(relative(logLikelihood, one.equal.logLikelihood)).toBeLessThan(1e-10);
      // The maximum is flat: an error of 1e-6 in p changes the likelihood in the twelfth digit.
      expect(relative(parameter, one.equal.p)).toBeLessThan(one.lump ? 1e-6 : 1e-9);
    }
    const rare = equalTrials(data, null);
    expect(relative(rare.logLikelihood, one.rare.logLikelihood)).toBeLessThan(1e-10);
    expect(relative(rare.parameter, one.rare.mean)).toBeLessThan(one.lump ? 1e-6 : 1e-9);
  });

  it('gives p = mean/N at the ends and likelihood 1', () => {
    expect(equalTrials(dataOf({ shots: [9], trials: 4 }), 4)).toEqual({ logLikelihood: 0, parameter: 0 });
    expect(equalTrials(dataOf({ shots: [0, 0, 9], trials: 2 }), 2)).toEqual({
      logLikelihood: 0,
      parameter: 1
    });
    expect(equalTrials(dataOf({ shots: [9], trials: null }), null)).toEqual({
      logLikelihood: 0,
      parameter: 0
    });
  });

  it('has a likelihood where the law underflows at the counts seen', () => {
    // Half the shots at 0, half at 5000, Poisson mean 2500: h ln f, with ln f about −2500 and −1000.
    const far = [50, ...new Array<number>(4999).fill(0), 50];
    const { logLikelihood, parameter } = equalTrials(dataOf({ shots: far, trials: null }), null);
    expect(parameter).toBeCloseTo(2500, 6);
    let logFactorial = 0;
    for (let n = 2; n <= 5000; n++) logFactorial += Math.log(n);
    const want = 50 * -2500 + 50 * (5000 * Math.log(2500) - 2500 - logFactorial);
    expect(relative(logLikelihood, want)).toBeLessThan(1e-10);
  });
});
