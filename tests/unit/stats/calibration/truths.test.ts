import { describe, expect, it } from 'vitest';
import { truths } from '$lib/stats/calibration/truths';
import { lawMoments } from '$lib/stats/laws/law-moments';

describe('the truths', () => {
  it('are four families at three N, and each family once with N withheld', () => {
    const names = truths.map(({ id }) => id);
    expect(new Set(names).size).toBe(names.length);
    for (const family of ['equal', 'spread', 'sparse', 'landau-zener']) {
      for (const size of ['12', '20', '64', 'unknown']) expect(names).toContain(`${family}-${size}`);
    }
  });

  it('have as many trials as they say, every probability inside 0 … 1', () => {
    for (const { trials, law } of truths) {
      const number = law.levels.reduce((sum, level) => sum + level.trials, 0);
      if (trials !== null) expect(number).toBe(trials);
      for (const { p } of law.levels) {
        expect(p).toBeGreaterThan(0);
        expect(p).toBeLessThan(1);
      }
    }
  });

  it('are what their families claim', () => {
    for (const { id, family, trials, law } of truths) {
      const { mean, variance } = lawMoments(law);
      const dispersion = variance / (mean * (1 - mean / (trials ?? Infinity)));
      if (family === 'equal') expect(dispersion, id).toBeCloseTo(1, 12);
      if (family === 'spread') expect(dispersion, id).toBeLessThan(0.8);
      if (family === 'sparse') expect(mean, id).toBeCloseTo(1.5, 12);
      // Σ exp(−2k²) over k = (2j−1)π/2N is N/(2√(2π)) up to exponentially little: half a Gaussian integral.
      if (family === 'landau-zener')
        expect(mean / (trials ?? 64), id).toBeCloseTo(1 / Math.sqrt(8 * Math.PI), 4);
    }
  });
});
