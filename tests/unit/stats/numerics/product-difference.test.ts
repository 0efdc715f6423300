import { productDifference } from '$lib/stats/numerics/product-difference';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** k − n·p from whole numbers: a double p in (2^-30, 1] is a multiple of 2^-83. */
function exact(k: number, n: number, p: number): number {
  const scaled = BigInt(k) * 2n ** 83n - BigInt(n) * BigInt(p * 2 ** 83);
  return Number(scaled) / 2 ** 83;
}

describe('productDifference', () => {
  it('rounds the exact difference once', () => {
    const count = fc.integer({ min: 0, max: Number.MAX_SAFE_INTEGER });
    fc.assert(
      fc.property(
        count,
        fc.double({ min: 2 ** -30, max: 1, noNaN: true }),
        fc.integer({ min: -50, max: 50 }),
        (n, p, off) => {
          const k = Math.max(0, Math.round(n * p) + off);
          const want = exact(k, n, p);
          expect(Math.abs(productDifference(k, n, p) - want)).toBeLessThanOrEqual(2 ** -52 * Math.abs(want));
        }
      )
    );
  });

  it('shows what plain arithmetic loses', () => {
    const n = 2 ** 53 - 1;
    const k = Math.round(n * 0.1);
    expect(productDifference(k, n, 0.1)).toBe(exact(k, n, 0.1));
    expect(k - n * 0.1).not.toBe(exact(k, n, 0.1));
  });
});
