import { logHoeffdingTail } from '$lib/stats/bounds/log-hoeffding-tail';
import { logMeanChernoff } from '$lib/stats/bounds/log-mean-chernoff';
import { relativeEntropy } from '$lib/stats/bounds/relative-entropy';
import { maximise } from '$lib/stats/numerics/maximise';
import { describe, expect, it } from 'vitest';

describe('logMeanChernoff', () => {
  it('gives the value of science: Bin(100, 0.1), n ≥ 20', () => {
    // Recomputed with R 4.2: exp(-100 * 0.04440301) = 0.01179239
    expect(Math.exp(logMeanChernoff('high', 20, 10, 100))).toBeCloseTo(0.01179239, 8);
  });

  it('is −N·D, and the supremum over θ (second algorithm)', () => {
    for (const [count, mean, trials] of [
      [20, 10, 100],
      [3, 10, 100],
      [64, 9.6, 64],
      [11, 4.05, 12]
    ]) {
      const side = count > mean ? 'high' : 'low';
      const log = logMeanChernoff(side, count, mean, trials);
      expect(log).toBeCloseTo(-trials * relativeEntropy(count / trials, mean / trials), 11);
      const p = mean / trials;
      const best = maximise((t) => t * count - trials * Math.log1p(p * Math.expm1(t)), -40, 40, 1e-9);
      expect(log).toBeCloseTo(-best.value, 8);
    }
    const poisson = maximise((t) => 9 * t - 4 * Math.expm1(t), -10, 10, 1e-9);
    expect(logMeanChernoff('high', 9, 4, null)).toBeCloseTo(-poisson.value, 8);
  });

  it('lies above the exact extremal tail, and meets it at the ends of the support', () => {
    for (const trials of [40, null]) {
      for (let n = 0; n <= 40; n++) {
        for (const side of ['high', 'low'] as const) {
          const exact = logHoeffdingTail(side, n, 12.5, trials);
          const bound = logMeanChernoff(side, n, 12.5, trials);
          if (n === 0 || n === trials) expect(bound).toBeCloseTo(exact, 12);
          else if (exact < 0) expect(bound).toBeGreaterThan(exact);
        }
      }
    }
  });

  it('is 1 on the wrong side, and 0 outside the support', () => {
    expect(logMeanChernoff('high', 9, 10, 100)).toBe(0);
    expect(logMeanChernoff('high', 10, 10, 100)).toBe(0);
    expect(logMeanChernoff('low', 11, 10, null)).toBe(0);
    expect(logMeanChernoff('high', 101, 10, 100)).toBe(-Infinity);
    expect(logMeanChernoff('low', -1, 10, null)).toBe(-Infinity);
    expect(logMeanChernoff('high', 3, 0, 10)).toBe(-Infinity);
    expect(logMeanChernoff('low', 0, 10, null)).toBe(-10);
    expect(logMeanChernoff('high', 3, -1, 10)).toBeNaN();
    expect(logMeanChernoff('high', 3, 11, 10)).toBeNaN();
  });
});
