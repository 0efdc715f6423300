import { chainMoments } from '$lib/stats/misread/chain-moments';
import { neededRate } from '$lib/stats/misread/needed-rate';
import { describe, expect, it } from 'vitest';

describe('neededRate', () => {
  it('gives back the rate that made the moments, and carries the limits of the variance', () => {
    const { mean, variance } = chainMoments([{ p: 0.05, trials: 60 }], 0.013);
    const lower = chainMoments([{ p: 0.05, trials: 60 }], 0.013).variance * 0.9;
    const found = neededRate(mean, { value: variance, low: lower, high: variance * 1.05 }, 60);
    expect(found.value).toBeCloseTo(0.013, 10);
    expect(found.low!).toBeLessThan(0.013);
    expect(found.high!).toBeGreaterThan(0.013);
  });

  it('is 0 where none is needed and null where none would do', () => {
    const mean = 6;
    const ceiling = 6 * 0.9;
    expect(neededRate(mean, { value: ceiling, low: 1, high: 40 }, 60)).toEqual({
      value: 0,
      low: 0,
      high: null
    });
    expect(neededRate(0, { value: 0, low: null, high: null }, 60).value).toBeNull();
  });
});
