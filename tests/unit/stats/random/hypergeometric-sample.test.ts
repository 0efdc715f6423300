import { chiSquareTail } from '$lib/stats/numerics/chi-square-tail';
import { generator } from '$lib/stats/random/generator';
import { hypergeometricSample } from '$lib/stats/random/hypergeometric-sample';
import { describe, expect, it } from 'vitest';

/** Binomial coefficient by products: fine for the small numbers here. */
function choose(n: number, k: number): number {
  let ways = 1;
  for (let i = 1; i <= k; i++) ways = (ways * (n - k + i)) / i;
  return k < 0 || k > n ? 0 : ways;
}

describe('hypergeometricSample', () => {
  it.each([
    [7, 13, 6],
    [40, 60, 50],
    [3, 200, 150],
    [90, 10, 30]
  ])('draws %i marked and %i others, %i taken, by the law', (marked, others, taken) => {
    const draws = 40_000;
    const seen = new Map<number, number>();
    const random = generator(11, marked);
    for (let i = 0; i < draws; i++) {
      const k = hypergeometricSample(random, marked, others, taken);
      seen.set(k, (seen.get(k) ?? 0) + 1);
    }
    let square = 0;
    let cells = 0;
    let [rareSeen, rareExpected] = [0, 0];
    for (let k = 0; k <= marked; k++) {
      const expected =
        (draws * choose(marked, k) * choose(others, taken - k)) / choose(marked + others, taken);
      const found = seen.get(k) ?? 0;
      if (expected === 0) expect(found).toBe(0);
      if (expected < 5) {
        rareSeen += found;
        rareExpected += expected;
        continue;
      }
      square += (found - expected) ** 2 / expected;
      cells++;
    }
    if (rareExpected > 5) square += (rareSeen - rareExpected) ** 2 / rareExpected;
    expect(chiSquareTail(square, cells)).toBeGreaterThan(0.001);
  });

  it('has the mean and variance of the law at a hundred thousand shots', () => {
    const [marked, others, taken, draws] = [30_000, 70_000, 50_000, 4000];
    const random = generator(12, 0);
    let [sum, squares] = [0, 0];
    const mean = (taken * marked) / (marked + others);
    for (let i = 0; i < draws; i++) {
      const d = hypergeometricSample(random, marked, others, taken) - mean;
      sum += d;
      squares += d * d;
    }
    const variance = (mean * others * taken) / ((marked + others) * (marked + others - 1));
    expect(Math.abs(sum / draws)).toBeLessThan(4 * Math.sqrt(variance / draws));
    expect(Math.abs(squares / draws / variance - 1)).toBeLessThan(4 * Math.sqrt(2 / draws));
  });

  it('knows the ends and refuses what is no number of things', () => {
    const random = generator(1, 0);
    expect(hypergeometricSample(random, 0, 9, 4)).toBe(0);
    expect(hypergeometricSample(random, 5, 0, 4)).toBe(4);
    expect(hypergeometricSample(random, 5, 3, 8)).toBe(5);
    for (const bad of [-1, 0.5, NaN])
      expect(() => hypergeometricSample(random, bad, 3, 1)).toThrow(RangeError);
    expect(() => hypergeometricSample(random, 2, 3, 6)).toThrow(RangeError);
  });
});
