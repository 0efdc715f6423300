import { batchIndex } from '$lib/stats/order/batch-index';
import { betweenBatches } from '$lib/stats/order/between-batches';
import { describe, expect, it } from 'vitest';
import { meanAndVariance } from './orders';

const centred = (shots: readonly number[]) => {
  const { mean } = meanAndVariance(shots);
  return Float64Array.from(shots, (n) => n - mean);
};

describe('betweenBatches', () => {
  it('is the sum over batches of n_b (mean_b − mean)²', () => {
    // Batches 1, 3 and 8: means 2 and 8, mean 4: 2·4 + 1·16.
    expect(betweenBatches(centred([1, 3, 8]), batchIndex(['x', 'x', 'y']))).toBeCloseTo(24, 12);
  });
});
