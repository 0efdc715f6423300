import { logGamma } from '$lib/stats/numerics/log-gamma';
import { describe, expect, it } from 'vitest';
import { reference } from './reference';

describe('logGamma', () => {
  it('agrees with 40 digits', () => {
    for (const { row } of reference('logGamma')) {
      const [x, want] = row;
      expect(Math.abs(logGamma(x) - want), `x = ${x}`).toBeLessThan(2e-15 * Math.max(4, Math.abs(want)));
    }
  });

  it('obeys the reflection and the duplication formula', () => {
    for (let x = 0.03; x < 1; x += 0.07) {
      const reflected = Math.log(Math.PI / Math.sin(Math.PI * x));
      expect(logGamma(x) + logGamma(1 - x)).toBeCloseTo(reflected, 13);
      const doubled = (1 - 2 * x) * Math.LN2 + 0.5 * Math.log(Math.PI) + logGamma(2 * x);
      expect(logGamma(x) + logGamma(x + 0.5)).toBeCloseTo(doubled, 13);
    }
  });

  it('is exact at its zeros and refuses negative numbers', () => {
    expect(logGamma(1)).toBe(0);
    expect(logGamma(2)).toBe(0);
    expect(logGamma(0)).toBe(Infinity);
    expect(logGamma(Infinity)).toBe(Infinity);
    expect(logGamma(-0.5)).toBeNaN();
  });
});
