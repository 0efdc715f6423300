import { continuedFraction } from '$lib/stats/numerics/continued-fraction';
import { describe, expect, it } from 'vitest';

describe('continuedFraction', () => {
  it('gives the golden ratio', () => {
    const golden = continuedFraction(1, (_, into) => {
      into.numerator = 1;
      into.denominator = 1;
    });
    expect(golden).toBeCloseTo((Math.sqrt(5) - 1) / 2, 14);
  });

  it('gives 4/π (Brouncker)', () => {
    // 4/π = 1 + 1²/(3 + 2²/(5 + 3²/(7 + …)))
    const inverse = continuedFraction(1, (j, into) => {
      into.numerator = j * j;
      into.denominator = 2 * j + 1;
    });
    expect(inverse).toBeCloseTo(Math.PI / 4, 14);
  });

  it('stops where a numerator is 0', () => {
    const value = continuedFraction(2, (j, into) => {
      into.numerator = j < 3 ? 1 : 0;
      into.denominator = 2;
    });
    expect(value).toBeCloseTo(1 / (2 + 1 / (2 + 1 / 2)), 15);
  });
});
