import { runsCount } from '$lib/stats/order/runs-count';
import { describe, expect, it } from 'vitest';

describe('runsCount', () => {
  it('counts stretches above and not above the cut', () => {
    expect(runsCount([3, 4, 0, 0, 5, 1], 2)).toBe(4);
    expect(runsCount([0, 5, 0, 5], 2)).toBe(4);
    expect(runsCount([0, 0, 5, 5], 2)).toBe(2);
    expect(runsCount([2, 2, 2], 2)).toBe(1);
    expect(runsCount([], 2)).toBe(0);
  });
});
