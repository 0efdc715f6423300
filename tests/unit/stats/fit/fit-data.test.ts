import { fitData } from '$lib/stats/fit/fit-data';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const histogram: Histogram = {
  kind: 'histogram',
  counts: [
    [0, 7],
    [2, 0],
    [3, 5],
    [6, 1]
  ],
  lump: null
};

describe('fitData', () => {
  it('lays the shots out from the first to the last count seen', () => {
    const data = fitData(histogram, 9);
    expect(data).toMatchObject({ trials: 9, first: 0, total: 13, lump: null, withoutEmpty: false });
    expect([...data.shots]).toEqual([7, 0, 0, 5, 0, 0, 1]);
  });

  it('sets empty shots aside', () => {
    const data = fitData(histogram, null, true);
    expect(data).toMatchObject({ first: 3, total: 6, withoutEmpty: true });
    expect([...data.shots]).toEqual([5, 0, 0, 1]);
  });

  it('counts the lump in the total, and stands when nothing else was seen', () => {
    const lump = { from: 8, shots: 4 };
    expect(fitData({ ...histogram, lump }, null)).toMatchObject({ total: 17, lump });
    const alone = fitData({ kind: 'histogram', counts: [], lump }, null);
    expect(alone).toMatchObject({ total: 4, first: 8 });
    expect(alone.shots).toHaveLength(0);
  });
});
