import { logPoissonTail } from '$lib/stats/numerics/log-poisson-tail';
import { poissonInterval } from '$lib/stats/numerics/poisson-interval';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reference, relativeError } from './reference';

describe('poissonInterval', () => {
  it('agrees with 40 digits, up to 1e15 and 1 − 1e-6', () => {
    for (const { row } of reference('poissonInterval')) {
      const [k, level, low, high] = row;
      const interval = poissonInterval(k, level);
      expect(relativeError(interval.low, low), `low of ${k} at ${level}`).toBeLessThan(1e-13);
      expect(relativeError(interval.high, high), `high of ${k} at ${level}`).toBeLessThan(1e-13);
    }
  });

  it('gives the limits of Garwood’s table', () => {
    // Garwood 1936, table I, 95 % (from memory): 0: 3.69, 1: 0.0253–5.57, 4: 1.09–10.24, 30: 20.24–42.83.
    expect(poissonInterval(0).high).toBeCloseTo(3.69, 2);
    expect(poissonInterval(1).low).toBeCloseTo(0.0253, 4);
    expect(poissonInterval(1).high).toBeCloseTo(5.57, 2);
    expect(poissonInterval(4).low).toBeCloseTo(1.09, 2);
    expect(poissonInterval(4).high).toBeCloseTo(10.24, 2);
    expect(poissonInterval(30).low).toBeCloseTo(20.24, 2);
    expect(poissonInterval(30).high).toBeCloseTo(42.83, 2);
  });

  it('puts half the doubt beyond each end', () => {
    const count = fc.oneof(
      fc.integer({ min: 0, max: 50 }),
      fc.integer({ min: 0, max: Number.MAX_SAFE_INTEGER })
    );
    const level = fc.oneof(fc.double({ min: 0.01, max: 0.999, noNaN: true }), fc.constant(1 - 1e-6));
    fc.assert(
      fc.property(count, level, (k, doubt) => {
        const { low, high } = poissonInterval(k, doubt);
        const want = Math.log((1 - doubt) / 2);
        const blur = 1e-11 + 1e-15 * Math.sqrt(k);
        if (k > 0) expect(Math.abs(logPoissonTail('high', k, low) - want)).toBeLessThan(blur);
        expect(Math.abs(logPoissonTail('low', k, high) - want)).toBeLessThan(blur);
      }),
      { numRuns: 500 }
    );
  });

  it('answers at 0 and refuses the rest', () => {
    expect(poissonInterval(0).low).toBe(0);
    expect(relativeError(poissonInterval(0).high, -Math.log(0.025))).toBeLessThan(1e-14);
    for (const [k, level] of [
      [-1, 0.95],
      [1.5, 0.95],
      [3, 1],
      [3, 0],
      [NaN, 0.95]
    ]) {
      expect(poissonInterval(k, level)).toEqual({ low: NaN, high: NaN });
    }
  });
});
