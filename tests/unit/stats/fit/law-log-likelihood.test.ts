import { lawLogLikelihood } from '$lib/stats/fit/law-log-likelihood';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import { describe, expect, it } from 'vitest';
import { lawOf } from '../laws/enumerate';
import { dataOf, plainLogLikelihood } from './plain';

describe('lawLogLikelihood', () => {
  it('is Σ h ln f with the tail sum of a lump', () => {
    const p = [0.1, 0.4, 0.4, 0.75, 1];
    const problem = { shots: [0, 3, 9, 4], trials: 5, lump: { from: 4, shots: 2 } };
    expect(lawLogLikelihood(dataOf(problem), lawOf(p))).toBeCloseTo(plainLogLikelihood(problem, p), 11);
  });

  it('takes exact logarithms where the law underflows', () => {
    // One shot at 400 under Poisson(0.5): about e^−2277.
    const shots = [1000, 500, ...new Array<number>(398).fill(0), 1];
    const rare = { levels: [], poissonPart: 0.5 };
    const want = 1000 * logPoissonPmf(0, 0.5) + 500 * logPoissonPmf(1, 0.5) + logPoissonPmf(400, 0.5);
    expect(want).toBeLessThan(-2500);
    expect(Math.abs(lawLogLikelihood(dataOf({ shots, trials: null }), rare) / want - 1)).toBeLessThan(1e-12);
  });

  it('takes a lump by its tail sum, within the window, at its end and far beyond', () => {
    const rare = { levels: [], poissonPart: 0.5 };
    for (const from of [1, 5, 12, 17, 18, 19, 20, 60, 150, 300]) {
      const data = dataOf({ shots: [10], trials: null, lump: { from, shots: 1 } });
      const want = 10 * logPoissonPmf(0, 0.5) + logPoissonTail('high', from, 0.5);
      expect(Math.abs(lawLogLikelihood(data, rare) / want - 1), `from ${from}`).toBeLessThan(1e-11);
    }
    // At the last possible count the tail is one product: 0.01^8.
    const eight = dataOf({ shots: [1], trials: 8, lump: { from: 8, shots: 1 } });
    const want = 8 * (Math.log(0.99) + Math.log(0.01));
    expect(lawLogLikelihood(eight, lawOf(new Array<number>(8).fill(0.01)))).toBeCloseTo(want, 10);
  });

  it('is −Infinity for a count the law forbids', () => {
    expect(lawLogLikelihood(dataOf({ shots: [1, 1], trials: 2 }), lawOf([1, 0.5]))).toBe(-Infinity);
    expect(lawLogLikelihood(dataOf({ shots: [0, 1, 1, 1], trials: 3 }), lawOf([0, 0.5, 0.5]))).toBe(
      -Infinity
    );
  });
});
