import { fitData } from '$lib/stats/fit/fit-data';
import type { Histogram } from '$lib/stats/types';
import { distribution } from '$lib/stats/views/distribution';
import { lawTable } from '$lib/stats/views/law-table';
import { describe, expect, it } from 'vitest';

const law = { levels: [{ p: 0.5, trials: 4 }], poissonPart: 0 };

function rows(counts: [number, number][], lump: Histogram['lump'] = null) {
  const histogram: Histogram = { kind: 'histogram', counts, lump };
  const data = fitData(histogram, 4);
  return distribution(histogram, data.total, 4, lawTable(data, law));
}

describe('distribution', () => {
  it('shows h/S with its exact interval beside f, for every count', () => {
    const found = rows([
      [1, 5],
      [2, 4],
      [4, 1]
    ]);
    expect(found.map(({ count }) => count)).toEqual([0, 1, 2, 3, 4]);
    expect(found.map(({ fitted }) => fitted * 16)).toEqual([1, 4, 6, 4, 1].map((f) => expect.closeTo(f, 12)));
    expect(found[1]).toMatchObject({ shots: 5, observed: 0.5, density: 0.25, lump: false });
    // Clopper & Pearson 1934, 95 % limits of 5/10, 1/10 and 0/10 (R 4.2, binom.test).
    expect(found[1].low).toBeCloseTo(0.187086, 6);
    expect(found[1].high).toBeCloseTo(0.812914, 6);
    expect(found[4].low).toBeCloseTo(0.0025286, 6);
    expect(found[4].high).toBeCloseTo(0.445016, 5);
    expect(found[0]).toMatchObject({ shots: 0, observed: 0, low: 0 });
    expect(found[0].high).toBeCloseTo(0.308497, 6);
  });

  it('ends with the lump and its tail', () => {
    const found = rows([[1, 5]], { from: 3, shots: 5 });
    expect(found.map(({ count, lump }) => [count, lump])).toEqual([
      [0, false],
      [1, false],
      [2, false],
      [3, true]
    ]);
    expect(found[3].fitted).toBeCloseTo(5 / 16, 12);
    expect(found[3].shots).toBe(5);
  });
});
