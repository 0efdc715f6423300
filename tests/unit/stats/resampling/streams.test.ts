import { stream } from '$lib/stats/resampling/streams';
import { describe, expect, it } from 'vitest';

describe('stream', () => {
  it('never gives two families the same number, up to a million resamples', () => {
    const families = ['equal trials', 'fitted law', 'shot order', 'batches', 'intervals'] as const;
    const ranges = families
      .map((family) => [stream(family, 0), stream(family, 2 ** 20 - 1)])
      .sort(([a], [b]) => a - b);
    ranges.forEach(([first, last], i) => {
      expect(last - first).toBe(2 ** 20 - 1);
      if (i > 0) expect(first).toBeGreaterThan(ranges[i - 1][1]);
    });
    expect(stream('batches', 5) - stream('batches', 0)).toBe(5);
  });
});
