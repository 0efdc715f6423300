import { relativeEntropy } from '$lib/stats/bounds/relative-entropy';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

describe('relativeEntropy', () => {
  it('is the textbook formula where that does not cancel', () => {
    for (const [a, b] of [
      [0.2, 0.1],
      [0.9, 0.3],
      [0.5, 0.01]
    ]) {
      const plain = a * Math.log(a / b) + (1 - a) * Math.log((1 - a) / (1 - b));
      expect(relativeEntropy(a, b)).toBeCloseTo(plain, 14);
    }
    // The rate of Bin(100, 0.1), n = 20: −ln(0.01179239)/100 (R 4.2).
    expect(relativeEntropy(0.2, 0.1)).toBeCloseTo(0.04440301, 8);
  });

  it('keeps its digits for a near b', () => {
    for (const b of [0.3, 0.9, 1e-4]) {
      const a = b * (1 + 2 ** -30);
      const d = a - b;
      // d²/2b(1−b) − d³(1/b² − 1/(1−b)²)/6
      const want = (d * d) / (2 * b * (1 - b)) - (d ** 3 * (1 / b ** 2 - 1 / (1 - b) ** 2)) / 6;
      expect(relativeEntropy(a, b) / want).toBeCloseTo(1, 12);
    }
  });

  it('is not negative, 0 on the diagonal, and above 2(a−b)² (Pinsker)', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(share, share, (a, b) => {
        expect(relativeEntropy(a, b)).toBeGreaterThanOrEqual(2 * (a - b) ** 2 * (1 - 1e-12));
        expect(relativeEntropy(a, a)).toBe(0);
      })
    );
  });

  it('answers at the ends and refuses the rest', () => {
    expect(relativeEntropy(0, 0.25)).toBeCloseTo(-Math.log(0.75), 15);
    expect(relativeEntropy(1, 0.25)).toBeCloseTo(-Math.log(0.25), 15);
    expect(relativeEntropy(0.5, 0)).toBe(Infinity);
    expect(relativeEntropy(0.5, 1)).toBe(Infinity);
    expect(relativeEntropy(1, 1)).toBe(0);
    expect(relativeEntropy(1.1, 0.5)).toBeNaN();
    expect(relativeEntropy(0.5, -0.1)).toBeNaN();
  });
});
