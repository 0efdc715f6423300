import { runsCount } from '$lib/stats/order/runs-count';
import { runsMoments } from '$lib/stats/order/runs-moments';
import { describe, expect, it } from 'vitest';
import { meanAndVariance, orders } from './orders';

describe('runsMoments', () => {
  it.each([
    [1, 1],
    [1, 5],
    [3, 4],
    [2, 5]
  ])('are those of all orders of %d shots above and %d below', (above, below) => {
    const shots = [...Array<number>(above).fill(1), ...Array<number>(below).fill(0)];
    const exact = meanAndVariance(orders(shots).map((order) => runsCount(order, 0)));
    const { mean, variance } = runsMoments(above, below);
    expect(mean).toBeCloseTo(exact.mean, 12);
    expect(variance).toBeCloseTo(exact.variance, 12);
  });
});
