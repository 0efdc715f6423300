import { ceiling } from '$lib/stats/bounds/ceiling';
import { criticalTrials } from '$lib/stats/bounds/critical-trials';
import { describe, expect, it } from 'vitest';

describe('criticalTrials', () => {
  it('is where the ceiling meets the variance', () => {
    for (const [mean, variance] of [
      [10, 9],
      [4.05, 2.6],
      [0.61, 0.6],
      [300, 1]
    ]) {
      const trials = criticalTrials(mean, variance);
      expect(ceiling(mean, trials)).toBeCloseTo(variance, 9);
      expect(ceiling(mean, (trials ?? NaN) * 0.999)).toBeLessThan(variance);
    }
    expect(criticalTrials(10, 9)).toBe(100);
  });

  it('says when no number of trials helps', () => {
    expect(criticalTrials(4, 4)).toBeNull();
    expect(criticalTrials(4, 5)).toBeNull();
    expect(criticalTrials(0, 0)).toBeNull();
    expect(criticalTrials(4, -1)).toBeNull();
    expect(criticalTrials(NaN, 1)).toBeNull();
  });
});
