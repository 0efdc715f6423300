import { describe, expect, it } from 'vitest';
import { logRiseP } from '$lib/stats/sites/log-rise-p';

/** By whole numbers. */
function byHand(both: number, first: number, second: number, shots: number): number {
  const choose = (n: number, k: number): bigint => {
    let value = 1n;
    if (k < 0 || k > n) return 0n;
    for (let i = 1; i <= k; i++) value = (value * BigInt(n - k + i)) / BigInt(i);
    return value;
  };
  let sum = 0n;
  for (let k = both; k <= Math.min(first, second); k++)
    sum += choose(first, k) * choose(shots - first, second - k);
  return Number((sum * 10n ** 17n) / choose(shots, second)) / 1e17;
}

describe("Fisher's test of a rise", () => {
  it('is 17/70 for the tea: three of four cups named (Fisher 1935, The Design of Experiments)', () => {
    expect(Math.exp(logRiseP(3, 4, 4, 8))).toBeCloseTo(17 / 70, 14);
  });

  it('is the sum of all tables with as many or more', () => {
    for (const [first, second, shots] of [
      [9, 14, 40],
      [30, 25, 40],
      [1, 39, 40]
    ])
      for (let both = Math.max(0, first + second - shots); both <= Math.min(first, second); both++)
        expect(Math.exp(logRiseP(both, first, second, shots))).toBeCloseTo(
          byHand(both, first, second, shots),
          11
        );
  });
});
