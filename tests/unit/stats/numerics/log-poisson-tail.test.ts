import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { logPoissonPmf } from '$lib/stats/numerics/log-poisson-pmf';
import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import { describe, expect, it } from 'vitest';
import { reference, relativeError, tailError } from './reference';

describe('logPoissonTail', () => {
  it('agrees with 40-digit sums and integrals, up to means of 8e15', () => {
    for (const { side, row } of reference('logPoissonTail')) {
      const [, k, mean, want] = row;
      expect(tailError(logPoissonTail(side, k, mean), want), `${side} ${k} at ${mean}`).toBeLessThan(2e-12);
    }
  });

  it('agrees with sums of the pmf down to 1e-290 (second algorithm)', () => {
    for (const mean of [0.61, 12.5, 300, 1500]) {
      const far = Math.ceil(mean + 45 * Math.sqrt(mean) + 200);
      let high = 0;
      for (let k = far; k >= 0; k--) {
        high += Math.exp(logPoissonPmf(k, mean));
        if (high > 1e-290) {
          expect(relativeError(Math.exp(logPoissonTail('high', k, mean)), high)).toBeLessThan(1e-11);
        }
      }
      let low = 0;
      for (let k = 0; k <= mean; k++) {
        low += Math.exp(logPoissonPmf(k, mean));
        if (low > 1e-290)
          expect(relativeError(Math.exp(logPoissonTail('low', k, mean)), low)).toBeLessThan(1e-11);
      }
    }
  });

  it('is the limit of binomial tails', () => {
    for (const k of [1, 3, 8, 40]) {
      const binomial = logBinomialTail('high', k, 2 ** 52, 4 / 2 ** 52);
      expect(tailError(binomial, logPoissonTail('high', k, 4))).toBeLessThan(1e-12);
    }
  });

  it('answers at the ends and refuses the rest', () => {
    expect(logPoissonTail('high', 0, 2)).toBe(0);
    expect(logPoissonTail('low', -1, 2)).toBe(-Infinity);
    expect(logPoissonTail('high', 1, 0)).toBe(-Infinity);
    expect(logPoissonTail('low', 0, 0)).toBe(0);
    expect(logPoissonTail('high', 1.2, 3)).toBe(logPoissonTail('high', 2, 3));
    expect(logPoissonTail('high', 1, -1)).toBeNaN();
    expect(logPoissonTail('high', NaN, 1)).toBeNaN();
  });
});
