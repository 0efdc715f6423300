import { shotsForExcess, smallestExcess } from '$lib/stats/answer/smallest-excess';
import { shotsToDecide } from '$lib/stats/answer/shots-to-decide';
import { describe, expect, it } from 'vitest';

describe('smallestExcess', () => {
  it('is 2.49·√((2 + κ4/κ2²)/S): by hand for Bin(12, 0.25) and Poisson(0.5) at 1000 shots', () => {
    // Bin(12, ¼): κ2 = 2.25, κ4 = κ2(1 − 6·3/16) = −0.28125, κ4/κ2² = −0.0555556.
    expect(smallestExcess(3, 12, 1000)).toBeCloseTo(2.49 * Math.sqrt((2 - 0.28125 / 2.25 ** 2) / 1000), 12);
    // Poisson: κ4/κ2² = 1/mean.
    expect(smallestExcess(0.5, null, 1000)).toBeCloseTo(2.49 * Math.sqrt(4 / 1000), 12);
  });

  it('is undone by shotsForExcess, and null without spread', () => {
    const shots = shotsForExcess(3, 12, 0.1)!;
    expect(smallestExcess(3, 12, shots)).toBeLessThanOrEqual(0.1);
    expect(smallestExcess(3, 12, shots - 1)).toBeGreaterThan(0.1);
    expect(smallestExcess(0, 12, 1000)).toBeNull();
    expect(smallestExcess(12, 12, 1000)).toBeNull();
  });
});

describe('shotsToDecide', () => {
  const base = { mean: 3, trials: 12, shots: 100, tolerance: 0.1, alpha: 0.01, tests: 6 };
  const dispersion = (value: number) => ({ value, low: null, high: null });

  it('at or under the ceiling: as many as bring the upper limit under the tolerance, by hand', () => {
    // Bin(12, ¼): shape 2 − 0.0555556; (1.96 + 0.842)² · 1.9444444/0.01 = 1526.6.
    expect(shotsToDecide({ ...base, dispersion: dispersion(0.9) })).toBe(1527);
  });

  it('above the ceiling: the nearer of the two answers', () => {
    const at = (value: number) => shotsToDecide({ ...base, dispersion: dispersion(value) })!;
    expect(at(1.05)).toBeGreaterThan(at(1.01));
    expect(at(1.12)).toBeGreaterThan(at(1.3));
    // Ruling out at 0.01/6 takes (0.842 + 2.935)²/0.098² · 1.944 = 2889 shots; bringing it under 1.1 would take 3.8 million.
    expect(at(1.098)).toBeGreaterThan(2800);
    expect(at(1.098)).toBeLessThan(3000);
  });

  it('never asks for fewer than there are', () => {
    expect(shotsToDecide({ ...base, shots: 50_000, dispersion: dispersion(1.3) })).toBe(100_000);
  });

  it('gives none without spread', () => {
    expect(shotsToDecide({ ...base, mean: 0, dispersion: dispersion(1) })).toBeNull();
  });
});
