import { findRoot } from '$lib/stats/numerics/find-root';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('findRoot', () => {
  it('finds known roots to the last digits', () => {
    expect(findRoot((x) => x ** 3 - 2, 0, 2)).toBeCloseTo(Math.cbrt(2), 15);
    expect(findRoot(Math.cos, 0, 3)).toBeCloseTo(Math.PI / 2, 15);
    expect(findRoot((x) => Math.exp(x) - 1e-12, -100, 100)).toBeCloseTo(Math.log(1e-12), 12);
    // A steep root, hard for secants alone.
    expect(findRoot((x) => Math.atan(1e6 * (x - 0.3)), -5, 4)).toBeCloseTo(0.3, 12);
    expect(findRoot((x) => (x - 1) ** 9, 0, 3.3)).toBeCloseTo(1, 2);
  });

  it('finds the root of every cubic that crosses once, with few evaluations', () => {
    const place = fc.double({ min: -5, max: 5, noNaN: true });
    fc.assert(
      fc.property(place, fc.double({ min: 0.01, max: 10, noNaN: true }), (at, slope) => {
        let calls = 0;
        const root = findRoot((x) => (calls++, (x - at) * ((x - at) ** 2 + slope)), -6, 7);
        expect(root).toBeCloseTo(at, 12);
        expect(calls).toBeLessThan(60);
      })
    );
  });

  it('stops at the tolerance', () => {
    let calls = 0;
    const root = findRoot((x) => (calls++, Math.exp(x) - 3), 0, 40, 1e-3);
    expect(Math.abs(root - Math.log(3))).toBeLessThan(1e-3);
    let more = 0;
    findRoot((x) => (more++, Math.exp(x) - 3), 0, 40);
    expect(calls).toBeLessThan(more);
  });

  it('takes a zero at an end, and refuses ends of one sign', () => {
    expect(findRoot((x) => x, 0, 2)).toBe(0);
    expect(findRoot((x) => x - 2, 0, 2)).toBe(2);
    expect(findRoot((x) => x * x + 1, -1, 1)).toBeNaN();
    expect(findRoot(() => NaN, -1, 1)).toBeNaN();
  });
});
