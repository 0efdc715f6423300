import { outwardWindow } from '$lib/stats/laws/outward-window';
import { describe, expect, it } from 'vitest';

describe('outwardWindow', () => {
  it('builds a law from its ratios and normalises it', () => {
    // A geometric law cut at 4, from its mode 0: weights 1, ½, ¼, ⅛, 1/16 over 31/16.
    const { first, values } = outwardWindow(
      0,
      () => 0,
      (n) => (n < 4 ? 0.5 : 0),
      0,
      1
    );
    expect(first).toBe(0);
    expect(Array.from(values, (value) => value * 31)).toEqual([16, 8, 4, 2, 1]);
  });

  it('walks down as well, and stops under the trim', () => {
    const { first, values } = outwardWindow(
      10,
      () => 0.1,
      () => 0.01,
      2e-4,
      1
    );
    // Below: 0.1, 0.01, 0.001 (1e-4 is under the trim); above: 0.01 alone (1e-4 is too).
    expect(first).toBe(7);
    expect(values).toHaveLength(5);
    expect(values.reduce((sum, value) => sum + value, 0)).toBeCloseTo(1, 14);
    expect(values[3] / values[0]).toBeCloseTo(1000, 9);
  });
});
