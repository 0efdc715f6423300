import { permute } from '$lib/stats/order/permute';
import { describe, expect, it } from 'vitest';

const calm = { breathe: async () => {} };
const shots = Float64Array.of(1, 2, 3, 4);

describe('permute', () => {
  it('counts the orders that reach: 4 stays last in one order of four', async () => {
    const result = await permute(shots, (order) => order[3] === 4, { resamples: 9999, seed: 1 }, calm);
    expect(result.stoppedEarly).toBe(true);
    // 100 exceedances: standard error of p about p·√(0.75/100).
    expect(Math.abs(result.p - 0.25)).toBeLessThan(4 * 0.25 * Math.sqrt(0.75 / 100));
    expect([...shots]).toEqual([1, 2, 3, 4]);
  });

  it('draws permutation b from stream + b: the answer repeats, and moves with seed and stream', async () => {
    const seen = async (seed: number, stream?: number) => {
      const orders: string[] = [];
      await permute(shots, (order) => orders.push(order.join()) < 0, { resamples: 50, seed, stream }, calm);
      return orders;
    };
    const orders = await seen(1, 7);
    expect(await seen(1, 7)).toEqual(orders);
    expect(await seen(1, 8)).toEqual([...orders.slice(1), (await seen(1, 57))[0]]);
    expect(await seen(2, 7)).not.toEqual(orders);
  });

  it('tells how far it is, and stops when the pace throws', async () => {
    const shares: number[] = [];
    const pace = { breathe: async (share: number) => void shares.push(share) };
    await permute(shots, () => false, { resamples: 50, seed: 1 }, pace);
    expect(shares).toEqual(Array.from({ length: 50 }, (_, b) => (b + 1) / 50));
    const cancelled = { breathe: () => Promise.reject(new Error('cancelled')) };
    await expect(permute(shots, () => false, { resamples: 50, seed: 1 }, cancelled)).rejects.toThrow(
      'cancelled'
    );
  });

  it('draws fewer permutations of very long lists and owns up to it', async () => {
    const long = new Float64Array(200_000);
    const { resamples, smallestP } = await permute(long, () => true, { resamples: 1999, seed: 1 }, calm);
    expect([resamples, smallestP]).toEqual([100, 1 / 201]);
  });
});
