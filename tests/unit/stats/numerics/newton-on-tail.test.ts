import { newtonOnTail } from '$lib/stats/numerics/newton-on-tail';
import { describe, expect, it } from 'vitest';

describe('newtonOnTail', () => {
  it('finds the zero of a concave function from either side', () => {
    for (const start of [-3, -1, 0.5, 0.7, 3]) {
      expect(newtonOnTail(start, (x) => [2 - Math.exp(x), -Math.exp(x)])).toBeCloseTo(Math.LN2, 14);
    }
    expect(newtonOnTail(1e-9, (x) => [Math.log(x) + 4, 1 / x])).toBeCloseTo(Math.exp(-4), 15);
  });

  it('keeps the digits of x on the scale of its logarithm', () => {
    const root = newtonOnTail(1e12, (x) => [Math.log(x / 3e13), 1], 'log');
    expect(Math.abs(root / 3e13 - 1)).toBeLessThan(4e-16);
  });

  it('says when there is nothing to find', () => {
    expect(newtonOnTail(1, () => [NaN, 1])).toBeNaN();
  });
});
