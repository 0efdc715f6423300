import { batchIndex } from '$lib/stats/order/batch-index';
import { describe, expect, it } from 'vitest';

describe('batchIndex', () => {
  it('numbers batches as they come and counts their shots', () => {
    const { of, sizes } = batchIndex(['b', 'a', 'b', 'toString', 'a', 'b']);
    expect([...of]).toEqual([0, 1, 0, 2, 1, 0]);
    expect([...sizes]).toEqual([3, 2, 1]);
  });
});
