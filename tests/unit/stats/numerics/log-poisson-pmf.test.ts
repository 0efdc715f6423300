import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import { describe, expect, it } from 'vitest';
import { reference, tailError } from './reference';

describe('logPoissonPmf', () => {
  it('agrees with 40 digits', () => {
    for (const { row } of reference('logPoissonPmf')) {
      const [k, mean, want] = row;
      expect(tailError(logPoissonPmf(k, mean), want), `${k}, ${mean}`).toBeLessThan(5e-13);
    }
  });

  it('follows f_{k+1}/f_k = m/(k+1)', () => {
    for (const mean of [0.61, 30, 5000]) {
      for (let k = 0; k < 400; k++) {
        const step = logPoissonPmf(k + 1, mean) - logPoissonPmf(k, mean);
        expect(step).toBeCloseTo(Math.log(mean / (k + 1)), 11);
      }
    }
  });

  it('answers at the ends and refuses the rest', () => {
    expect(logPoissonPmf(0, 0)).toBeCloseTo(0, 15);
    expect(logPoissonPmf(1, 0)).toBe(-Infinity);
    expect(logPoissonPmf(-1, 2)).toBe(-Infinity);
    expect(logPoissonPmf(1, -2)).toBeNaN();
    expect(logPoissonPmf(NaN, 2)).toBeNaN();
  });
});
