import { logChoose } from '$lib/stats/numerics/log-choose';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('logChoose', () => {
  it('agrees with exact binomial coefficients, up to n = 2^53', () => {
    for (const { row } of reference('logChoose')) {
      const [n, k, want] = row;
      expect(relativeError(logChoose(n, k), want), `C(${n}, ${k})`).toBeLessThan(4e-15);
    }
  });

  it('builds the triangle of Pascal', () => {
    let line = [1n];
    for (let n = 1; n <= 120; n++) {
      line = [1n, ...line.slice(1).map((value, k) => value + line[k]), 1n];
      for (let k = 1; k < n; k++) {
        expect(relativeError(logChoose(n, k), Math.log(Number(line[k])))).toBeLessThan(4e-15);
      }
    }
  });

  it('answers outside the triangle', () => {
    expect(logChoose(5, 0)).toBe(0);
    expect(logChoose(5, 5)).toBe(0);
    expect(logChoose(5, 6)).toBe(-Infinity);
    expect(logChoose(5, -1)).toBe(-Infinity);
    expect(logChoose(5, 1.5)).toBeNaN();
    expect(logChoose(-5, 1)).toBeNaN();
  });
});
