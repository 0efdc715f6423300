import { bestLaw } from '$lib/stats/fit/best-law';
import { parityExcess, parityNeeds } from '$lib/stats/resampling/parity-excess';
import { refitted } from '$lib/stats/resampling/refitted';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf } from '../fit/plain';

describe('parityExcess', () => {
  it('counts even shots against S·P(even), in its own standard deviations', () => {
    const data = dataOf({ shots: [40, 20, 40], trials: 2 });
    const of = refitted(data, levelsOf([[0.5, 2]]), {
      levels: levelsOf([[0.5, 2]]),
      logLikelihood: 0,
      window: { first: 0, values: Float64Array.of(0.25, 0.5, 0.25), scale: 1 }
    });
    // 80 even of 100, half expected, σ = 5.
    expect(parityExcess(of)).toBeCloseTo(30 / 5, 12);
  });

  it('is the same for an excess of odd shots, and looks at the count and not at its place', () => {
    const even = dataOf({ shots: [0, 0, 30, 10, 30, 10, 30], trials: null });
    const odd = dataOf({ shots: [0, 30, 10, 30, 10, 30], trials: null });
    const of = (data: typeof even) => parityExcess(refitted(data, bestLaw(data).levels));
    expect(of(even)).toBeGreaterThan(4);
    expect(of(odd)).toBeGreaterThan(4);
  });

  it('is 0 when the law leaves no choice', () => {
    const data = dataOf({ shots: [0, 0, 7], trials: 5 });
    expect(parityExcess(refitted(data, bestLaw(data).levels))).toBe(0);
  });

  it('needs no more G² than any law leaves under which it is as large', () => {
    for (const [even, p, shots] of [
      [60, 0.5, 100],
      [30, 0.4, 100],
      [9_300, 0.92, 10_000]
    ]) {
      const data = dataOf({ shots: [even, shots - even], trials: 1 });
      const q = even / shots;
      // G² of the two cells; a law with more cells can only have more.
      const gSquared = 2 * shots * (q * Math.log(q / p) + (1 - q) * Math.log((1 - q) / (1 - p)));
      const z = Math.abs(even - shots * p) / Math.sqrt(shots * p * (1 - p));
      expect(parityNeeds(data, z)).toBeLessThanOrEqual(gSquared);
      // And not idly: within a factor of nine, three in z.
      expect(parityNeeds(data, z)).toBeGreaterThan(gSquared / 9);
    }
    // Only odd shots, and nothing exceeded: any law will do.
    expect(parityNeeds(dataOf({ shots: [0, 1], trials: 1 }), 0)).toBe(0);
  });
});
