import { inUnits } from '$lib/stats/input/in-units';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const of = (counts: [number, number][], lump: Histogram['lump'] = null): Histogram => ({
  kind: 'histogram',
  counts,
  lump
});
const ring = of([
  [0, 5],
  [2, 8],
  [6, 1]
]);

describe('inUnits', () => {
  it('leaves defects as they are', () => {
    expect(inUnits(ring, 9, 'defect')).toEqual({ histogram: ring, trials: 9 });
    expect(inUnits(ring, null, 'defect').trials).toBeNull();
  });

  it('counts pairs as n/2 out of N/2', () => {
    const { histogram, trials } = inUnits(of(ring.counts, { from: 8, shots: 2 }), 20, 'pair');
    expect(trials).toBe(10);
    expect(histogram.counts).toEqual([
      [0, 5],
      [1, 8],
      [3, 1]
    ]);
    expect(histogram.lump).toEqual({ from: 4, shots: 2 });
    expect(inUnits(ring, null, 'pair').trials).toBeNull();
  });

  it('refuses counts above N, and odd things in pairs', () => {
    expect(() => inUnits(ring, 5, 'defect')).toThrow(/count of 6 was seen, more than the 5 trials/);
    expect(() => inUnits(of([[0, 5]], { from: 7, shots: 1 }), 6, 'defect')).toThrow(/count of 7/);
    expect(() => inUnits(of([[3, 4]]), 20, 'pair')).toThrow(/4 shots have count 3/);
    expect(() => inUnits(ring, 21, 'pair')).toThrow(/must be even, not 21/);
    expect(() => inUnits(of([[0, 5]], { from: 7, shots: 1 }), 20, 'pair')).toThrow(/closing row/);
  });
});
