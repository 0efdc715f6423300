import { describe, expect, it } from 'vitest';
import { share } from '$lib/stats/calibration/share';

describe('share', () => {
  it('has the exact interval', () => {
    // science.md 11, recomputed there with R's binom.test: 1 of 10 gives 0.0025286 … 0.445016.
    const one = share(1, 10);
    expect(one.share).toBe(0.1);
    expect(one.low).toBeCloseTo(0.0025286, 7);
    expect(one.high).toBeCloseTo(0.445016, 6);
  });

  it('says nothing of nothing', () => {
    expect(share(0, 0)).toEqual({ hits: 0, of: 0, share: null, low: 0, high: 1 });
  });
});
