import { fitData } from '$lib/stats/fit/fit-data';
import type { Law } from '$lib/stats/types';
import { distribution } from '$lib/stats/views/distribution';
import { lawTable } from '$lib/stats/views/law-table';
import { ratePoints } from '$lib/stats/views/rate-points';
import { describe, expect, it } from 'vitest';

function rates(counts: [number, number][], trials: number | null, law: Law, lumpFrom: number | null = null) {
  const lump = lumpFrom === null ? null : { from: lumpFrom, shots: 3 };
  const histogram = { kind: 'histogram' as const, counts, lump };
  const data = fitData(histogram, trials);
  const table = lawTable(data, law);
  return ratePoints(distribution(histogram, data.total, trials, table), data.total, trials, table);
}

const tenth = { levels: [{ p: 0.1, trials: 100 }], poissonPart: 0 };

describe('ratePoints', () => {
  it('gives horizon ln(S)/N and silence −ln(1 − 0.05^{1/S})/N', () => {
    const rate = rates(
      [
        [9, 600],
        [20, 400]
      ],
      100,
      tenth
    );
    expect(rate.scale).toBe(100);
    expect(rate.horizon).toBeCloseTo(Math.log(1000) / 100, 15);
    // 0.05^{0.001} by hand: 0.99700875, and −ln(0.00299125) = 5.812063.
    expect(rate.silence).toBeCloseTo(-Math.log(1 - 0.05 ** 0.001) / 100, 12);
    expect(rate.silence * 100).toBeCloseTo(5.812063, 4);
    // An empty count has exactly that lower limit at one-sided 95 %; its two-sided one lies below.
    const never = rate.points.find(({ count }) => count === 12)!;
    expect(never).toMatchObject({ empirical: null, high: null });
    expect(never.low).toBeLessThan(rate.silence);
    expect(never.low).toBeCloseTo(-Math.log(1 - 0.025 ** 0.001) / 100, 12);
  });

  it('keeps the digits of silence for 2^52 shots, where 0.05^{1/S} is all but 1', () => {
    const { silence } = rates(
      [
        [0, 2 ** 51],
        [1, 2 ** 51]
      ],
      1,
      { levels: [{ p: 0.5, trials: 1 }], poissonPart: 0 }
    );
    // 1 − 0.05^{1/S} → ln(20)/S.
    expect(silence).toBeCloseTo(Math.log(2 ** 52) - Math.log(Math.log(20)), 10);
  });

  it('shows −ln(h/S)/N, the finite-N law, the large-deviation limit and the parabola', () => {
    const { points } = rates(
      [
        [9, 600],
        [20, 400]
      ],
      100,
      tenth
    );
    const twenty = points.find(({ count }) => count === 20)!;
    expect(twenty.density).toBeCloseTo(0.2, 12);
    expect(twenty.empirical).toBeCloseTo(-Math.log(0.4) / 100, 14);
    expect(twenty.low).toBeLessThan(twenty.empirical!);
    expect(twenty.high).toBeGreaterThan(twenty.empirical!);
    // I(0.2) of Bin(100, 0.1), recomputed with mpmath.
    expect(twenty.limit).toBeCloseTo(0.04440301, 8);
    // (20 − 10)²/(2·9·100).
    expect(twenty.gaussian).toBeCloseTo(100 / 1800, 14);
    // They differ by the prefactor, about ln(2πNσ²)/(2N) with the tilted σ² = 16.
    expect(twenty.fitted! - twenty.limit!).toBeCloseTo(Math.log(2 * Math.PI * 16) / 200, 3);
    const mode = points.find(({ count }) => count === 10)!;
    expect(mode.limit).toBeCloseTo(0, 12);
    expect(mode.gaussian).toBeCloseTo(0, 12);
  });

  it('divides by nothing when N is unknown, and gives the lump no rate', () => {
    const rate = rates(
      [
        [0, 5],
        [1, 4]
      ],
      null,
      { levels: [], poissonPart: 0.8 },
      2
    );
    expect(rate.scale).toBe(1);
    expect(rate.horizon).toBeCloseTo(Math.log(12), 14);
    expect(rate.points.map(({ count }) => count)).toEqual([0, 1]);
    expect(rate.points[0].limit).toBeCloseTo(0.8, 12);
    expect(rate.points[0].fitted).toBeCloseTo(0.8, 12);
    expect(rate.points[0].density).toBeNull();
  });

  it('is null where the law gives no probability, and without a variance', () => {
    const sure = {
      levels: [
        { p: 1, trials: 2 },
        { p: 0, trials: 2 }
      ],
      poissonPart: 0
    };
    const { points } = rates([[2, 9]], 4, sure);
    expect(points[0]).toMatchObject({ fitted: null, limit: null, gaussian: null });
    expect(points[2]).toMatchObject({ fitted: 0, limit: 0, empirical: 0 });
  });
});
