import { chiSquareTail } from '$lib/stats/numerics/chi-square-tail';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('chiSquareTail', () => {
  it('agrees with 40 digits (SciPy beside them) down to 1e-284', () => {
    for (const { row } of reference('chiSquareTail')) {
      const [x, df, want] = row;
      expect(relativeError(chiSquareTail(x, df), want), `${x} on ${df}`).toBeLessThan(1e-12);
    }
  });

  it('gives the critical values of printed tables', () => {
    // Upper 5 % and 1 % points, e.g. Fisher & Yates 1938, table IV (from memory).
    expect(chiSquareTail(3.841, 1)).toBeCloseTo(0.05, 4);
    expect(chiSquareTail(16.919, 9)).toBeCloseTo(0.05, 4);
    expect(chiSquareTail(21.666, 9)).toBeCloseTo(0.01, 4);
  });

  it('is a finite sum for even degrees of freedom (second algorithm)', () => {
    for (const df of [2, 4, 10, 40]) {
      for (const x of [0.3, 5, 40, 200, 1200]) {
        let term = 1;
        let sum = 1;
        for (let j = 1; j < df / 2; j++) sum += term *= x / 2 / j;
        expect(relativeError(chiSquareTail(x, df), sum * Math.exp(-x / 2))).toBeLessThan(1e-12);
      }
    }
  });

  it('answers at the ends and refuses the rest', () => {
    expect(chiSquareTail(0, 3)).toBe(1);
    expect(chiSquareTail(-2, 3)).toBe(1);
    expect(chiSquareTail(Infinity, 3)).toBe(0);
    expect(chiSquareTail(1, 0)).toBeNaN();
    expect(chiSquareTail(NaN, 3)).toBeNaN();
  });
});
