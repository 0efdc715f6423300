import { misreadNeeded } from '$lib/stats/flags/misread-needed';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** Mean and variance of independent kinks on an open chain read with misreads (science.md 7). */
function moments(bonds: number, p: number, misread: number) {
  const m = 1 - 2 * p;
  const u = 1 - 2 * misread;
  return {
    mean: bonds * (p + 2 * misread * (1 - misread) * (1 - 2 * p)),
    variance: (bonds * (1 - m * m * u ** 4) + 2 * (bonds - 1) * m * m * u * u * (1 - u * u)) / 4
  };
}

describe('misreadNeeded', () => {
  it('N = 50, p = 0.05, ε = 0.01: variance 1.239 times the naive ceiling, and back', () => {
    const { mean, variance } = moments(50, 0.05, 0.01);
    expect(variance / (mean * (1 - mean / 50))).toBeCloseTo(1.239, 3);
    expect(misreadNeeded(mean, variance, 50)).toBeCloseTo(0.01, 12);
  });

  it('agrees with full enumeration of kinks and flips on four bonds', () => {
    const [bonds, p, e] = [4, 0.2, 0.07];
    let mean = 0;
    let square = 0;
    for (let kinks = 0; kinks < 2 ** bonds; kinks++) {
      for (let flips = 0; flips < 2 ** (bonds + 1); flips++) {
        let weight = 1;
        let count = 0;
        for (let i = 0; i <= bonds; i++) weight *= (flips >> i) & 1 ? e : 1 - e;
        for (let i = 0; i < bonds; i++) {
          weight *= (kinks >> i) & 1 ? p : 1 - p;
          count += ((kinks >> i) ^ (flips >> i) ^ (flips >> (i + 1))) & 1;
        }
        mean += weight * count;
        square += weight * count * count;
      }
    }
    expect(moments(bonds, p, e).mean).toBeCloseTo(mean, 12);
    expect(moments(bonds, p, e).variance).toBeCloseTo(square - mean * mean, 12);
    expect(misreadNeeded(mean, square - mean * mean, bonds)).toBeCloseTo(e, 10);
  });

  it('undoes the formula wherever it applies', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 2, max: 500 }),
        fc.double({ min: 0.001, max: 0.4, noNaN: true }),
        fc.double({ min: 0.001, max: 0.2, noNaN: true }),
        (bonds, p, misread) => {
          const { mean, variance } = moments(bonds, p, misread);
          expect(misreadNeeded(mean, variance, bonds)).toBeCloseTo(misread, 7);
        }
      )
    );
  });

  it('gives none below the ceiling, or where even p = 0 leaves too little', () => {
    expect(misreadNeeded(5, 4, 50)).toBeNull();
    expect(misreadNeeded(1, 40, 50)).toBeNull();
  });
});
