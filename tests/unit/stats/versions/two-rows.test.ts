import { twoRows } from '$lib/stats/versions/two-rows';
import { describe, expect, it } from 'vitest';

describe('twoRows', () => {
  it('lines counts up and leaves none out', () => {
    const table = twoRows(
      { kind: 'histogram', counts: [[0, 5], [3, 2]], lump: null }, // prettier-ignore
      { kind: 'histogram', counts: [[1, 4], [3, 1]], lump: null } // prettier-ignore
    );
    expect([...table.first]).toEqual([5, 0, 2]);
    expect([...table.second]).toEqual([0, 4, 1]);
    expect(table.totals).toEqual([7, 5]);
  });

  it('lumps both as the wider closing and opening rows do', () => {
    const table = twoRows(
      { kind: 'histogram', counts: [[2, 1], [3, 1]], lump: { from: 4, shots: 6 }, below: { to: 1, shots: 9 } }, // prettier-ignore
      { kind: 'histogram', counts: [[0, 1], [1, 2], [3, 3], [4, 4], [7, 5]], lump: null } // prettier-ignore
    );
    expect([...table.first]).toEqual([9, 1, 1, 6]);
    expect([...table.second]).toEqual([3, 0, 3, 9]);
  });
});
