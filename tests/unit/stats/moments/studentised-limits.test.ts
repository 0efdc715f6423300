import { studentisedLimits } from '$lib/stats/moments/studentised-limits';
import { describe, expect, it } from 'vitest';

const column = (length: number, value: (b: number) => number) =>
  Float64Array.from({ length }, (_, b) => value(b));

describe('studentisedLimits', () => {
  it('turns the outer quantiles of t round: 50th and 1950th of 1999', () => {
    // t* = −999 … 999 in a shuffled order (7 and 1999 have no common factor), errors of 2.
    const values = column(1999, (b) => 10 + 2 * (((7 * b) % 1999) - 999));
    const [low, high] = studentisedLimits(
      10,
      0.5,
      values,
      column(1999, () => 2),
      0.025
    );
    expect(low).toBeCloseTo(10 - 0.5 * 950, 10);
    expect(high).toBeCloseTo(10 + 0.5 * 950, 10);
  });

  it('goes straight between neighbours where the place is no whole number', () => {
    const values = column(99, (b) => b - 49);
    const [low, high] = studentisedLimits(
      0,
      1,
      values,
      column(99, () => 1),
      0.025
    );
    expect([low, high]).toEqual([-47.5, 47.5]);
  });

  it('has no limit on the side where too many resamples lost their spread', () => {
    const errors = column(999, (b) => (b < 30 ? 0 : 1));
    const values = column(999, (b) => (b < 30 ? 0 : 5 + (b - 514) / 100));
    const [low, high] = studentisedLimits(5, 1, values, errors, 0.025);
    expect(high).toBe(Infinity);
    expect(low).toBeLessThan(5);
    const undefinedOnes = column(999, (b) => (b < 30 ? NaN : 5 + (b - 514) / 100));
    expect(studentisedLimits(5, 1, undefinedOnes, errors, 0.025)).toEqual([low, high]);
  });

  it('has no limits when there are too few resamples for them', () => {
    const limits = studentisedLimits(
      0,
      1,
      column(19, (b) => b - 9),
      column(19, () => 1),
      0.025
    );
    expect(limits).toEqual([-Infinity, Infinity]);
  });

  it('takes the values as they are when the error of the data is zero', () => {
    const [low, high] = studentisedLimits(
      0.25,
      0,
      column(1999, (b) => b),
      column(1999, () => 1),
      0.025
    );
    expect([low, high]).toEqual([49, 1949]);
  });
});
