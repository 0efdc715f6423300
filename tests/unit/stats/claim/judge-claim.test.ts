import { judgeClaim } from '$lib/stats/claim/judge-claim';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** 10 with u = 1 above and u = 2 below: half-widths 1.959964 and 3.919928. */
const data = { value: 10, low: 10 - 2 * 1.959963985, high: 10 + 1.959963985 };
const exact = (value: number) => ({ value, sigma: 0 });
const wide = { level: 0.99, matters: 100 };

describe('judgeClaim', () => {
  it('measures the distance on the side of the claim', () => {
    expect(judgeClaim(data, exact(12), wide).distance).toBeCloseTo(2, 7);
    expect(judgeClaim(data, exact(8), wide).distance).toBeCloseTo(-1, 7);
    // Both uncertainties: 4/√(1 + 3) above.
    expect(judgeClaim(data, { value: 14, sigma: Math.sqrt(3) }, wide).distance).toBeCloseTo(2, 7);
  });

  it('gives the two-sided normal probability', () => {
    // R 4.2: 2 * pnorm(-2) and 2 * pnorm(-5).
    expect(judgeClaim(data, exact(12), wide).p).toBeCloseTo(0.04550026389635842, 7);
    expect(judgeClaim(data, exact(15), wide).p! / 5.733031437583869e-7).toBeCloseTo(1, 5);
  });

  it('calls a claim wrong beyond the quantile of its level and not before', () => {
    // R 4.2: qnorm(0.975) = 1.959964, qnorm(0.995) = 2.575829.
    for (const [level, quantile] of [
      [0.95, 1.959964],
      [0.99, 2.575829]
    ]) {
      const at = (value: number) => judgeClaim(data, exact(value), { level, matters: 100 }).verdict;
      expect(at(10 + quantile - 1e-5)).toBe('agrees');
      expect(at(10 + quantile + 1e-5)).toBe('disagrees');
      expect(at(10 - 2 * quantile + 1e-5)).toBe('agrees');
      expect(at(10 - 2 * quantile - 1e-5)).toBe('disagrees');
    }
  });

  it('cannot tell when the wider half exceeds both what matters and the claim’s own width', () => {
    const half = 2 * 1.959963985;
    const at = (matters: number, sigma: number) =>
      judgeClaim(data, { value: 10, sigma }, { level: 0.99, matters }).verdict;
    expect(at(half - 1e-6, 0)).toBe('cannot-tell');
    expect(at(half + 1e-6, 0)).toBe('agrees');
    expect(at(0, 2.00001)).toBe('agrees');
    expect(at(0, 1.99999)).toBe('cannot-tell');
    // A wrong claim is wrong, however wide the data.
    expect(judgeClaim(data, exact(20), { level: 0.99, matters: 0 }).verdict).toBe('disagrees');
  });

  it('cannot tell where the data set no limit on the claim’s side', () => {
    const open = { value: 10, low: 9, high: null };
    expect(judgeClaim(open, exact(1e9), wide)).toMatchObject({
      verdict: 'cannot-tell',
      distance: null,
      p: null
    });
    expect(judgeClaim(open, exact(1), wide).verdict).toBe('disagrees');
    expect(judgeClaim(open, exact(9.9), wide).verdict).toBe('cannot-tell');
    expect(judgeClaim({ value: null, low: null, high: null }, exact(1), wide).verdict).toBe('cannot-tell');
  });

  it('of two exact numbers asks whether they are the same', () => {
    const point = { value: 3, low: 3, high: 3 };
    expect(judgeClaim(point, exact(3), wide)).toMatchObject({ verdict: 'agrees', distance: 0, p: 1 });
    expect(judgeClaim(point, exact(3.1), wide)).toMatchObject({
      verdict: 'disagrees',
      distance: Infinity,
      p: 0
    });
  });

  it('refuses what is no number', () => {
    for (const value of [NaN, Infinity])
      expect(() => judgeClaim(data, exact(value), wide)).toThrow(RangeError);
    expect(() => judgeClaim(data, { value: 1, sigma: -1 }, wide)).toThrow(RangeError);
    expect(() => judgeClaim(data, exact(1), { level: 1, matters: 0 })).toThrow(RangeError);
    expect(() => judgeClaim(data, exact(1), { level: 0.95, matters: NaN })).toThrow(RangeError);
  });

  it('does not depend on the scale, and a wider claim is never wrong where a sharper one agrees', () => {
    const number = fc.double({ min: -50, max: 50, noNaN: true });
    const size = fc.double({ min: 0, max: 5, noNaN: true });
    fc.assert(
      fc.property(number, size, fc.double({ min: 0.01, max: 100, noNaN: true }), (value, sigma, scale) => {
        const here = judgeClaim(data, { value, sigma }, wide);
        const scaled = judgeClaim(
          { value: 10 * scale, low: data.low * scale, high: data.high * scale },
          { value: value * scale, sigma: sigma * scale },
          { level: 0.99, matters: 100 * scale }
        );
        const wider = judgeClaim(data, { value, sigma: sigma + 1 }, wide);
        expect(scaled.distance! / (here.distance! || 1)).toBeCloseTo(here.distance === 0 ? 0 : 1, 6);
        if (here.verdict !== 'disagrees') expect(wider.verdict).not.toBe('disagrees');
      })
    );
  });
});
