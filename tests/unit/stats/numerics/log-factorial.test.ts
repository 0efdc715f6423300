import { logFactorial } from '$lib/stats/numerics/log-factorial';
import { describe, expect, it } from 'vitest';
import { relativeError } from './reference';

describe('logFactorial', () => {
  it('is the sum of logarithms, across the end of its table', () => {
    let sum = 0;
    for (let n = 1; n <= 400; n++) {
      sum += Math.log(n);
      expect(relativeError(logFactorial(n), sum), `n = ${n}`).toBeLessThan(n === 1 ? 1e-300 : 3e-15);
    }
  });

  it('agrees with exact products', () => {
    // 20! = 2432902008176640000, OEIS A000142.
    expect(logFactorial(20)).toBe(Math.log(2432902008176640000));
    expect(logFactorial(0)).toBe(0);
  });

  it('refuses fractions and negative numbers', () => {
    expect(logFactorial(2.5)).toBeNaN();
    expect(logFactorial(-1)).toBeNaN();
    expect(logFactorial(NaN)).toBeNaN();
  });
});
