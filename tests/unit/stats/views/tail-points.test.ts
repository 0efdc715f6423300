import { fitData } from '$lib/stats/fit/fit-data';
import type { Histogram, Law } from '$lib/stats/types';
import { distribution } from '$lib/stats/views/distribution';
import { lawTable } from '$lib/stats/views/law-table';
import { meanBounds } from '$lib/stats/nulls/mean-bounds';
import { tailPoints } from '$lib/stats/views/tail-points';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, lawOf } from '../laws/enumerate';

function tails(counts: [number, number][], trials: number | null, law: Law, lump: Histogram['lump'] = null) {
  const histogram = { kind: 'histogram' as const, counts, lump };
  const data = fitData(histogram, trials);
  const table = lawTable(data, law);
  return tailPoints(
    distribution(histogram, data.total, trials, table),
    data.total,
    table,
    meanBounds(table.mean, trials)
  );
}

describe('tailPoints', () => {
  it('sums the shots at or beyond each count, on the side of the mean it lies', () => {
    const found = tails(
      [
        [0, 1],
        [1, 5],
        [2, 8],
        [3, 4],
        [4, 2]
      ],
      4,
      { levels: [{ p: 0.5, trials: 4 }], poissonPart: 0 }
    );
    expect(found.map(({ count, side, shots }) => [count, side, shots])).toEqual([
      [0, 'low', 1],
      [1, 'low', 6],
      [3, 'high', 6],
      [4, 'high', 2]
    ]);
    expect(found[1].observed).toBeCloseTo(0.3, 14);
    expect(found[1].fitted).toBeCloseTo(5 / 16, 12);
    expect(found[3].fitted).toBeCloseTo(1 / 16, 12);
    // Sure to be exact at the end of the support: e^{−N I(1)} = f_N.
    expect(found[3].chernoff).toBeCloseTo(1 / 16, 12);
  });

  it('gives the published bounds of Bin(100, 0.1), n ≥ 20', () => {
    const law = { levels: [{ p: 0.1, trials: 100 }], poissonPart: 0 };
    const at = tails(
      [
        [5, 50],
        [20, 1]
      ],
      100,
      law
    ).find(({ count }) => count === 20)!;
    // Recomputed with mpmath: Chernoff 0.01179239, exact 0.001978561.
    expect(at.chernoff).toBeCloseTo(0.01179239, 8);
    expect(at.meanChernoff).toBeCloseTo(0.01179239, 8);
    expect(at.fitted).toBeCloseTo(0.001978561, 9);
    // For equal trials Hoeffding's extremal tail is the tail itself.
    expect(at.hoeffding).toBeCloseTo(0.001978561, 9);
  });

  it('orders the bounds: fitted ≤ Chernoff ≤ Chernoff from the mean, fitted ≤ Hoeffding ≤ Chernoff from the mean', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 2, maxLength: 30 }), fc.boolean(), (p, known) => {
        const law = lawOf(p);
        const rows = p.map((_, n): [number, number] => [n, 1 + (n % 3)]);
        for (const at of tails(rows, known ? p.length : null, law)) {
          const room = 1 + 1e-9;
          expect(at.fitted).toBeLessThanOrEqual(at.chernoff * room + 1e-300);
          expect(at.chernoff).toBeLessThanOrEqual(at.meanChernoff * room + 1e-300);
          expect(at.fitted).toBeLessThanOrEqual(at.hoeffding * room + 1e-300);
          if (at.hoeffding < 1) expect(at.hoeffding).toBeLessThanOrEqual(at.meanChernoff * room + 1e-300);
          expect(at.low).toBeLessThanOrEqual(at.observed);
          expect(at.high).toBeGreaterThanOrEqual(at.observed);
        }
      }),
      { numRuns: 80 }
    );
  });

  it('counts a lump as a high tail, and never as a low one', () => {
    const law = { levels: [{ p: 0.9, trials: 6 }], poissonPart: 0 };
    const found = tails(
      [
        [2, 3],
        [3, 5]
      ],
      6,
      law,
      { from: 4, shots: 20 }
    );
    expect(found.filter(({ count }) => count === 4)).toEqual([]);
    expect(found.map(({ count }) => count)).toEqual([0, 1, 2, 3]);
    const low = { levels: [{ p: 0.2, trials: 6 }], poissonPart: 0 };
    const high = tails(
      [
        [0, 9],
        [1, 8]
      ],
      6,
      low,
      { from: 3, shots: 2 }
    ).find(({ count }) => count === 3)!;
    expect(high).toMatchObject({ side: 'high', shots: 2 });
  });
});
