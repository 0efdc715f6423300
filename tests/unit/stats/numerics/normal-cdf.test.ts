import { normalCdf } from '$lib/stats/numerics/normal-cdf';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

/** Second algorithm: Φ(x) − ½ = φ(x) Σ x^{2j+1}/(1·3·5…(2j+1)) (Marsaglia 2004). */
function bySeries(x: number): number {
  let term = x;
  let sum = x;
  for (let j = 3; Math.abs(term) > 1e-18 * Math.abs(sum) && j < 400; j += 2) sum += term *= (x * x) / j;
  return 0.5 + (sum * Math.exp(-0.5 * x * x)) / Math.sqrt(2 * Math.PI);
}

describe('normalCdf', () => {
  it('agrees with 40 digits in both tails', () => {
    for (const { row } of reference('normalCdf')) {
      expect(relativeError(normalCdf(row[0]), row[1]), `x = ${row[0]}`).toBeLessThan(1e-12);
    }
  });

  it('agrees with a series around 0', () => {
    for (let x = -3; x <= 5; x += 0.125) {
      if (x !== 0) expect(normalCdf(x)).toBeCloseTo(bySeries(x), 14);
    }
  });

  it('answers at the ends', () => {
    expect(normalCdf(0)).toBeCloseTo(0.5, 15);
    expect(normalCdf(-Infinity)).toBe(0);
    expect(normalCdf(Infinity)).toBe(1);
    expect(normalCdf(NaN)).toBeNaN();
  });
});
