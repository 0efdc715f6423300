import { autocorrelations } from '$lib/stats/order/autocorrelations';
import { describe, expect, it } from 'vitest';
import { DISCOVERIES } from './discoveries';

describe('autocorrelations', () => {
  it('agrees with R on yearly counts of discoveries', () => {
    // R 4.2.2: acf(discoveries, lag.max = 10)
    const expected = [
      0.2741351888668, 0.2520477137177, 0.2309542743539, 0.1188071570577, 0.0601391650099, 0.0199602385686,
      0.1505566600398, 0.1487475149105, 0.1091650099404, -0.0107355864811
    ];
    autocorrelations(DISCOVERIES, 10).forEach((r, i) => expect(r).toBeCloseTo(expected[i], 12));
  });

  it('does not lose digits to a large mean', () => {
    const lifted = DISCOVERIES.map((n) => n + 1e9);
    autocorrelations(lifted, 3).forEach((r, i) =>
      expect(r).toBeCloseTo(autocorrelations(DISCOVERIES, 3)[i], 9)
    );
  });

  it('has none for a constant series', () => {
    expect(autocorrelations([2, 2, 2], 1)[0]).toBeNaN();
    expect(autocorrelations([2, 2, 2], 0)).toEqual([]);
  });
});
