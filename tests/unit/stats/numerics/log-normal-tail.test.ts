import { logNormalTail } from '$lib/stats/numerics/log-normal-tail';
import { describe, expect, it } from 'vitest';
import { reference, tailError } from './reference';

describe('logNormalTail', () => {
  it('agrees with 40 digits, far below the smallest double', () => {
    for (const { row } of reference('logNormalTail')) {
      expect(tailError(logNormalTail(row[0]), row[1]), `x = ${row[0]}`).toBeLessThan(1e-12);
    }
  });

  it('lies inside the bounds of Mills’ ratio', () => {
    for (let x = 0.5; x < 60; x *= 1.4) {
      const density = -0.5 * x * x - 0.5 * Math.log(2 * Math.PI);
      expect(logNormalTail(x)).toBeLessThan(density - Math.log(x));
      expect(logNormalTail(x)).toBeGreaterThan(density + Math.log(x / (x * x + 1)));
    }
  });
});
