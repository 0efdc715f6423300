import { evenDispersionFactors } from '$lib/stats/moments/even-dispersion-factors';
import { describe, expect, it } from 'vitest';

describe('evenDispersionFactors', () => {
  it.each([
    // SciPy 1.17.1: f / chi2.isf(tail, f) and f / chi2.ppf(tail, f), f = (S - 1)/(1 - 1/N)
    [2, null, 0.025, 0.19904909520541283, 1018.2582697196705],
    [40, null, 0.025, 0.6710247748889461, 1.6487471415657493],
    [40, 12, 0.025, 0.6813919432323651, 1.6098954021049499],
    [3000, 64, 0.025, 0.9516229516659327, 1.0521806557480449],
    [1000001, null, 0.025, 0.9972339706716823, 1.0027776065849003],
    [40, null, 0.005, 0.5956419999376329, 1.9504029654469395]
  ])('has the chi-square limits, %d shots, N %s, tail %d', (shots, trials, tail, low, high) => {
    const factors = evenDispersionFactors(shots, trials, tail);
    expect(factors.low / low).toBeCloseTo(1, 9);
    expect(factors.high / high).toBeCloseTo(1, 9);
  });
});
