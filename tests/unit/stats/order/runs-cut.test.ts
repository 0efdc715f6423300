import { runsCut } from '$lib/stats/order/runs-cut';
import { describe, expect, it } from 'vitest';

const above = (shots: number[]) => shots.filter((n) => n > runsCut(shots)!).length;

describe('runsCut', () => {
  it('halves distinct counts, as the median does', () => {
    expect(above([9, 1, 7, 3])).toBe(2);
    expect(above([9, 1, 7, 3, 5])).toBe(2);
  });

  it('sends tied shots to the side that leaves the halves most even', () => {
    // Median 0, below which there is nothing.
    expect(above([0, 0, 0, 1, 2])).toBe(2);
    // Median 5, above which there is nothing.
    expect(above([5, 5, 5, 1, 2])).toBe(3);
    // 1 and 4 on either side of the ties: ties join the one.
    expect(above([0, 3, 3, 3, 4, 5, 6, 7])).toBe(4);
  });

  it('does not depend on the order', () => {
    expect(runsCut([4, 0, 2, 2, 1])).toBe(runsCut([2, 1, 4, 2, 0]));
  });

  it('has no cut where nothing differs', () => {
    expect(runsCut([])).toBeNull();
    expect(runsCut([7])).toBeNull();
    expect(runsCut([3, 3, 3])).toBeNull();
  });
});
