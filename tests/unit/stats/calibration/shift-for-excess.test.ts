import { shiftForExcess } from '$lib/stats/calibration/shift-for-excess';
import { expect, it } from 'vitest';

const at = (p: number) => ({ mean: 20 * p, variance: 20 * p * (1 - p) });
const ceiling = (mean: number) => mean * (1 - mean / 20);

it('agrees with the variance of a mixture by hand: 1 + 19δ²/(p(1 − p)) ceilings', () => {
  const shift = shiftForExcess(at, ceiling, { p: 0.2, trials: 20, shots: 1000, strength: 2 });
  // 2.49·√((2 + κ4/κ2²)/S), κ4/κ2² = (1 − 6p(1 − p))/(Np(1 − p)) of equal trials.
  const excess = 2 * 2.49 * Math.sqrt((2 + (1 - 6 * 0.16) / 3.2) / 1000);
  expect(shift).toBeCloseTo(Math.sqrt((excess * 0.16) / 19), 10);
});

it('is none where none is asked for, and refuses what no shift gives', () => {
  expect(shiftForExcess(at, ceiling, { p: 0.2, trials: 20, shots: 1000, strength: 0 })).toBe(0);
  expect(() => shiftForExcess(at, ceiling, { p: 0.01, trials: 20, shots: 10, strength: 9 })).toThrow(
    RangeError
  );
});
