import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pairLimit } from '$lib/stats/explanations/pair-limit';

const exact = (value: number) => ({ value, low: null, high: null });

describe('pairLimit', () => {
  it('is never above the true correlations, for any law of four dependent trials', () => {
    const weights = fc.array(fc.integer({ min: 0, max: 60 }), { minLength: 16, maxLength: 16 });
    let held = 0;
    fc.assert(
      fc.property(weights, (raw) => {
        // Cubed, so that some patterns dominate and the trials depend on each other.
        const cubes = raw.map((value) => value ** 3);
        const sum = cubes.reduce((a, b) => a + b, 0);
        fc.pre(sum > 0);
        const law = cubes.map((value) => value / sum);
        const bit = (word: number, i: number) => (word >> i) & 1;
        const expectation = (of: (word: number) => number) => law.reduce((a, f, word) => a + f * of(word), 0);
        const p = [0, 1, 2, 3].map((i) => expectation((word) => bit(word, i)));
        const sigma = p.map((share) => Math.sqrt(share * (1 - share)));
        let [covariance, products] = [0, 0];
        for (let i = 0; i < 4; i++) {
          for (let j = 0; j < 4; j++) {
            if (i === j) continue;
            covariance += expectation((word) => bit(word, i) * bit(word, j)) - p[i] * p[j];
            products += sigma[i] * sigma[j];
          }
        }
        const mean = p.reduce((a, b) => a + b, 0);
        const count = (word: number) => bit(word, 0) + bit(word, 1) + bit(word, 2) + bit(word, 3);
        const variance = expectation((word) => (count(word) - mean) ** 2);
        const ceiling = mean * (1 - mean / 4);
        const limit = pairLimit(4, ceiling, exact(variance / ceiling));
        if (!limit) return;
        held++;
        expect(limit.covariance).toBeLessThanOrEqual(covariance / 12 + 1e-12);
        expect(limit.correlation).toBeLessThanOrEqual(covariance / products + 1e-12);
      }),
      { seed: 12, numRuns: 2000 }
    );
    expect(held).toBeGreaterThan(200);
  });

  it('is met by equal trials of a common cause: ρ itself', () => {
    expect(pairLimit(64, 8.16, exact(1 + 63 * 0.016))!.correlation).toBeCloseTo(0.016, 12);
  });

  it('is silent below the ceiling, for one trial, and with N unknown', () => {
    expect(pairLimit(64, 8, exact(0.99))).toBeNull();
    expect(pairLimit(1, 0.2, exact(1.1))).toBeNull();
    expect(pairLimit(null, 8, exact(1.4))).toBeNull();
  });

  it('goes down with the lower limit of the variance, never below 0', () => {
    expect(pairLimit(11, 2, { value: 1.5, low: 1.2, high: 1.9 })!.correlationLow).toBeCloseTo(0.02, 12);
    expect(pairLimit(11, 2, { value: 1.1, low: 0.9, high: 1.4 })!.correlationLow).toBe(0);
  });
});
