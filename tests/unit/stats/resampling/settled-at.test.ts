import { gSquaredLeft } from '$lib/stats/resampling/g-squared-left';
import { settledAt } from '$lib/stats/resampling/settled-at';
import { describe, expect, it } from 'vitest';

describe('settledAt', () => {
  it('is where gSquaredLeft has come under the value asked for, from 10 shots to 2^50', () => {
    for (const total of [10, 5000, 1e9, 2 ** 50]) {
      for (const gSquared of [1e-3, 0.7, 8, 300]) {
        const saturated = -2.3 * total;
        const enough = settledAt(saturated, gSquared, total);
        if (enough === Infinity) continue;
        expect(gSquaredLeft(saturated, enough, total)).toBeLessThan(gSquared);
        // Not far under it, where sums are not rounded away.
        if (total < 1e6 && gSquared > 0.5)
          expect(gSquaredLeft(saturated, enough, total)).toBeGreaterThan(0.999 * gSquared);
      }
    }
  });

  it('is never where rounding alone might leave as much', () => {
    expect(settledAt(-100, 0, 50)).toBe(Infinity);
    expect(settledAt(-100, 1e-6, 50)).toBe(Infinity);
    expect(settledAt(-(2 ** 50), 1, 2 ** 50)).toBe(Infinity);
  });
});
