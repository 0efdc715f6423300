import { windowRate } from '$lib/stats/laws/window-rate';
import { chainRate } from '$lib/stats/misread/chain-rate';
import { chainWindow } from '$lib/stats/misread/chain-window';
import { describe, expect, it } from 'vitest';

/** Binomial probabilities by their recurrence. */
function binomial(trials: number, p: number): Float64Array {
  const out = new Float64Array(trials + 1);
  out[0] = (1 - p) ** trials;
  for (let n = 1; n <= trials; n++) out[n] = (out[n - 1] * (trials - n + 1) * p) / (n * (1 - p));
  return out;
}

describe('windowRate', () => {
  it('is N times the divergence of n/N from p for a binomial law', () => {
    const window = { first: 0, values: binomial(30, 0.2), scale: 1 };
    for (const n of [1, 3, 6, 7, 15, 29]) {
      const x = n / 30;
      const want = 30 * (x * Math.log(x / 0.2) + (1 - x) * Math.log((1 - x) / 0.8));
      expect(Math.abs(windowRate(window, n) - want)).toBeLessThan(1e-10 * Math.max(1, want));
    }
    expect(windowRate(window, 0)).toBeCloseTo(-30 * Math.log(0.8), 10);
    expect(windowRate(window, 30)).toBeCloseTo(-30 * Math.log(0.2), 10);
    expect(windowRate(window, 31)).toBe(Infinity);
    expect(windowRate(window, -1)).toBe(Infinity);
  });

  it('agrees with the rate from the generating function along a chain', () => {
    const blocks = [
      { p: 0.02, trials: 20 },
      { p: 0.4, trials: 10 }
    ];
    const window = chainWindow(blocks, 0.02);
    for (const n of [0, 1, 4, 9, 17, 28, 30]) {
      const want = chainRate(blocks, 0.02, n);
      expect(Math.abs(windowRate(window, n) - want)).toBeLessThan(1e-8 * Math.max(1, want));
    }
  });
});
