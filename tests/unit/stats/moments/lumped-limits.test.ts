import { lumpedLimits } from '$lib/stats/moments/lumped-limits';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Mean and unbiased variance of every list of counts that the lumps allow, by trying all of them. */
function tried({ counts, lump, below }: Histogram, trials: number): { means: number[]; variances: number[] } {
  let lists: number[][] = [counts.flatMap(([n, h]) => new Array<number>(h).fill(n))];
  const hide = (shots: number, from: number, to: number) => {
    for (let s = 0; s < shots; s++)
      lists = lists.flatMap((list) => Array.from({ length: to - from + 1 }, (_, i) => [...list, from + i]));
  };
  if (below) hide(below.shots, 0, below.to);
  if (lump) hide(lump.shots, lump.from, trials);
  const mean = (list: number[]) => list.reduce((a, b) => a + b, 0) / list.length;
  return {
    means: lists.map(mean),
    variances: lists.map((list) => {
      const m = mean(list);
      return list.reduce((sum, n) => sum + (n - m) ** 2, 0) / (list.length - 1);
    })
  };
}

describe('what lumped counts can hide', () => {
  it.each<Omit<Histogram, 'kind'>>([
    {
      counts: [
        [3, 4],
        [4, 2]
      ],
      lump: null,
      below: { to: 2, shots: 4 }
    },
    { counts: [[3, 1]], lump: null, below: { to: 2, shots: 5 } },
    { counts: [[3, 2]], lump: { from: 5, shots: 3 }, below: { to: 2, shots: 3 } },
    {
      counts: [
        [2, 1],
        [3, 1]
      ],
      lump: { from: 4, shots: 4 },
      below: { to: 1, shots: 3 }
    },
    {
      counts: [
        [0, 6],
        [1, 3]
      ],
      lump: { from: 2, shots: 4 }
    }
  ])('holds every list of counts, and is reached: %j', (rows) => {
    const histogram: Histogram = { kind: 'histogram', ...rows };
    const { means, variances } = tried(histogram, 7);
    const { mean, variance } = lumpedLimits(histogram, 7);
    expect(mean.low).toBeCloseTo(Math.min(...means), 12);
    expect(mean.high).toBeCloseTo(Math.max(...means), 12);
    expect(variance.low).toBeCloseTo(Math.min(...variances), 12);
    expect(variance.high).toBeCloseTo(Math.max(...variances), 12);
  });

  it('has no upper end where nothing ends the closing row', () => {
    const open = lumpedLimits({ kind: 'histogram', counts: [[1, 3]], lump: { from: 2, shots: 1 } }, null);
    expect(open.mean.high).toBeNull();
    expect(open.variance.high).toBeNull();
    const closed = lumpedLimits(
      { kind: 'histogram', counts: [[3, 3]], lump: null, below: { to: 2, shots: 1 } },
      null
    );
    expect(closed.mean).toEqual({ low: 9 / 4, high: 11 / 4 });
  });
});
