import { steadyRatio } from '$lib/stats/sweep/steady-ratio';
import { describe, expect, it } from 'vitest';

describe('steadyRatio', () => {
  it('of one pair is their quotient, with the error of the delta method', () => {
    // y/x = 3/4; variance (0.04 − 2·¾·0.01 + 9/16·0.02)/16 by hand = 0.0022656
    const found = steadyRatio([{ x: 4, y: 3, varX: 0.02, varY: 0.04, covariance: 0.01, weight: 7 }])!;
    expect(found.value).toBeCloseTo(0.75, 12);
    expect(found.error ** 2).toBeCloseTo((0.04 - 0.015 + 0.01125) / 16, 12);
    expect(found).toMatchObject({ freedom: 0, p: null });
  });

  it('weighs by what is known, and tells when the ratios differ', () => {
    const pair = (x: number, y: number, varY: number) => ({
      x,
      y,
      varX: 0,
      varY,
      covariance: 0,
      weight: x / varY
    });
    // Without errors in x it is weighted least squares through the origin, by hand.
    const found = steadyRatio([pair(1, 2, 1), pair(3, 3, 1 / 9)])!;
    expect(found.value).toBeCloseTo((2 + 9 * 9) / (1 + 9 * 9), 12);
    expect(found.error).toBeCloseTo(1 / Math.sqrt(82), 12);
    const r = 83 / 82;
    expect(found.chiSquare).toBeCloseTo((2 - r) ** 2 + 9 * (3 - 3 * r) ** 2, 12);
    expect(steadyRatio([pair(1, 2, 0.001), pair(3, 3, 0.001)])!.p).toBeLessThan(1e-6);
  });

  it('has none where the divisor is not positive', () => {
    expect(steadyRatio([])).toBeNull();
    expect(steadyRatio([{ x: 0, y: 1, varX: 1, varY: 1, covariance: 0, weight: 1 }])).toBeNull();
    expect(steadyRatio([{ x: 1, y: 1, varX: 0, varY: 0, covariance: 0, weight: 1 }])).toBeNull();
  });
});
