import { baseMeasure } from '$lib/stats/floor/base-measure';
import { describe, expect, it } from 'vitest';

describe('baseMeasure', () => {
  it('is ln C(N, n), and −ln n! for unknown N', () => {
    const six = [6, 15, 20, 15, 6];
    baseMeasure(6, 1, 5).forEach((value, i) => expect(value).toBeCloseTo(Math.log(six[i]), 12));
    [1, 1, 2, 6, 24].forEach((factorial, n) =>
      expect(baseMeasure(null, 0, 4)[n]).toBeCloseTo(-Math.log(factorial), 12)
    );
    expect(baseMeasure(4, 0, 4)[0] === 0 && baseMeasure(4, 4, 4)[0] === 0).toBe(true);
  });
});
