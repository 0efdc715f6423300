import { batchIndex } from '$lib/stats/order/batch-index';
import { betweenBatches } from '$lib/stats/order/between-batches';
import { betweenBatchesMoments } from '$lib/stats/order/between-batches-moments';
import { describe, expect, it } from 'vitest';
import { meanAndVariance, orders } from './orders';

const centred = (shots: readonly number[]) => {
  const { mean } = meanAndVariance(shots);
  return Float64Array.from(shots, (n) => n - mean);
};

describe('betweenBatchesMoments', () => {
  it.each([
    [
      [0, 1, 1, 4, 0, 2, 7],
      ['a', 'a', 'a', 'b', 'b', 'c', 'c']
    ],
    [
      [3, 0, 0, 0, 0, 0, 9],
      ['a', 'b', 'b', 'b', 'b', 'b', 'b']
    ],
    [
      [2, 5, 5],
      ['a', 'a', 'b']
    ],
    [
      [0, 1, 5, 6],
      ['a', 'b', 'c', 'c']
    ]
  ])('are those of all orders of %j over %j', (shots, batches) => {
    const index = batchIndex(batches);
    const distances = centred(shots);
    const exact = meanAndVariance(
      orders([...distances]).map((order) => betweenBatches(Float64Array.from(order), index))
    );
    const square = distances.reduce((sum, d) => sum + d ** 2, 0);
    const fourth = distances.reduce((sum, d) => sum + d ** 4, 0);
    const { mean, variance } = betweenBatchesMoments(index.sizes, square, fourth);
    expect(mean / exact.mean).toBeCloseTo(1, 12);
    expect(variance / exact.variance).toBeCloseTo(1, 10);
  });
});
