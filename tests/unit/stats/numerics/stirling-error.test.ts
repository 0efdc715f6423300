import { stirlingError } from '$lib/stats/numerics/stirling-error';
import { describe, expect, it } from 'vitest';
import { reference } from './reference';

describe('stirlingError', () => {
  it('agrees with 40 digits', () => {
    for (const { row } of reference('stirlingError')) {
      expect(Math.abs(stirlingError(row[0]) - row[1]), `n = ${row[0]}`).toBeLessThan(1.5e-15);
    }
  });

  it('joins its table, its climb and its series', () => {
    for (let n = 1; n <= 17; n++) {
      const step = (n - 0.5) * Math.log1p(1 / (n - 1 || NaN)) - 1;
      if (n > 1) expect(stirlingError(n - 1) - stirlingError(n)).toBeCloseTo(step, 14);
      expect(stirlingError(n + 1e-9)).toBeCloseTo(stirlingError(n), 9);
    }
  });

  it('has a limit at 0 and nothing below', () => {
    expect(stirlingError(0)).toBe(Infinity);
    expect(stirlingError(-1)).toBeNaN();
    expect(stirlingError(-0.5)).toBeNaN();
    expect(stirlingError(NaN)).toBeNaN();
  });
});
