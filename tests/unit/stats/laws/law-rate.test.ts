import { logMeanChernoff } from '$lib/stats/bounds/log-mean-chernoff';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { lawRate } from '$lib/stats/laws/law-rate';
import { lawWindow } from '$lib/stats/laws/law-window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, lawOf } from './enumerate';

describe('lawRate', () => {
  it('gives the published check value of Bin(100, 0.1) at 20', () => {
    // I(0.2) = D(0.2 ‖ 0.1) = 0.2 ln 2 + 0.8 ln(0.8/0.9); Chernoff bound e^{−100 I} (recomputed with mpmath).
    const rate = lawRate({ levels: [{ p: 0.1, trials: 100 }], poissonPart: 0 }, 20);
    expect(rate / 100).toBeCloseTo(0.04440301, 8);
    expect(Math.exp(-rate)).toBeCloseTo(0.01179239, 8);
  });

  it('is the supremum of θn − Λ(θ), by a grid over θ', () => {
    const law = lawOf([0.1, 0.35, 0.35, 0.8, 0.97], 0.7);
    for (const count of [0.5, 1, 2, 3.3, 4, 6, 11]) {
      let best = -Infinity;
      for (let theta = -12; theta <= 12; theta += 1e-3) {
        let generating = law.poissonPart * Math.expm1(theta);
        for (const { p } of law.levels) generating += Math.log1p(p * Math.expm1(theta));
        best = Math.max(best, theta * count - generating);
      }
      expect(lawRate(law, count)).toBeGreaterThanOrEqual(best - 1e-12);
      // A grid of 1e-3 misses the top of a parabola by at most σ²·(5e-4)²/2.
      expect(lawRate(law, count)).toBeLessThan(best + 1e-5);
    }
  });

  it('bounds every tail (Chernoff), and is never beaten by the bound from the mean alone', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 40 }), (p) => {
        const law = lawOf(p);
        const { mean } = lawMoments(law);
        const { first, values, scale } = lawWindow(law);
        for (let n = 0; n <= p.length; n++) {
          const side = n > mean ? 'high' : 'low';
          let tail = 0;
          values.forEach((value, k) => {
            if (side === 'high' ? first + k >= n : first + k <= n) tail += value / scale;
          });
          const rate = lawRate(law, n);
          expect(rate).toBeGreaterThanOrEqual(0);
          if (tail > 1e-290) expect(Math.log(tail)).toBeLessThan(-rate + 1e-9);
          expect(-rate).toBeLessThanOrEqual(logMeanChernoff(side, n, mean, p.length) + 1e-9);
        }
      }),
      { numRuns: 150 }
    );
  });

  it('is 0 at the mean, −ln f at the ends, Infinity off the support', () => {
    const law = lawOf([0.25, 0.5, 0.75]);
    expect(lawRate(law, 1.5)).toBeCloseTo(0, 12);
    expect(lawRate(law, 0)).toBeCloseTo(-Math.log(0.75 * 0.5 * 0.25), 12);
    expect(lawRate(law, 3)).toBeCloseTo(-Math.log(0.25 * 0.5 * 0.75), 12);
    expect(lawRate(law, 4)).toBe(Infinity);
    expect(lawRate(law, -1)).toBe(Infinity);
  });
});
