import { equalSquares } from '$lib/stats/drift/equal-squares';
import { strewnSquares } from '$lib/stats/drift/strewn-squares';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

/** Every way to lay T defects on the places of a batch, each as likely: brute force. */
function enumerated(total: number, shots: number, trials: number): { mean: number; variance: number } {
  const places = shots * trials;
  let number = 0;
  let sum = 0;
  let square = 0;
  for (let mask = 0; mask < 2 ** places; mask++) {
    const counts = new Array<number>(shots).fill(0);
    let laid = 0;
    for (let k = 0; k < places; k++)
      if ((mask >> k) & 1) {
        laid++;
        counts[k % shots]++;
      }
    if (laid !== total) continue;
    const q = counts.reduce((all, n) => all + (n - total / shots) ** 2, 0);
    number++;
    sum += q;
    square += q * q;
  }
  return { mean: sum / number, variance: square / number - (sum / number) ** 2 };
}

describe('equalSquares', () => {
  it.each([
    [2, 2, 3],
    [3, 3, 3],
    [5, 4, 3],
    [6, 3, 4],
    [11, 4, 3],
    [1, 4, 3],
    [12, 4, 3],
    [2, 2, 1],
    [2, 3, 1]
  ])('%i defects in %i shots of %i trials, against every way to lay them', (total, shots, trials) => {
    const found = equalSquares(total, shots, trials);
    const all = enumerated(total, shots, trials);
    expect(found.mean).toBeCloseTo(all.mean, 10);
    expect(found.variance).toBeCloseTo(all.variance, 10);
  });

  it('N unknown is the limit of many trials, and every way to drop 5 defects into 3 shots', () => {
    const near = equalSquares(40, 7, 1e9);
    const limit = equalSquares(40, 7, null);
    expect(limit.mean).toBeCloseTo(near.mean, 5);
    expect(limit.variance).toBeCloseTo(near.variance, 4);
    const sums: number[] = [];
    for (let code = 0; code < 3 ** 5; code++) {
      const counts = [0, 0, 0];
      for (let k = 0, rest = code; k < 5; k++, rest = Math.floor(rest / 3)) counts[rest % 3]++;
      sums.push(counts.reduce((all, n) => all + (n - 5 / 3) ** 2, 0));
    }
    const mean = sums.reduce((a, b) => a + b, 0) / sums.length;
    const found = equalSquares(5, 3, null);
    expect(found.mean).toBeCloseTo(mean, 10);
    expect(found.variance).toBeCloseTo(sums.reduce((all, q) => all + (q - mean) ** 2, 0) / sums.length, 10);
  });
});

describe('strewnSquares', () => {
  it.each([
    [12, 5, 4],
    [17, 5, 4],
    [9, 6, null]
  ])('draws %i defects in %i shots of %s trials with that mean and variance', (total, shots, trials) => {
    const random = generator(3, total);
    const buffer = new Float64Array(8);
    const draws = Array.from({ length: 20_000 }, () => strewnSquares(random, total, shots, trials, buffer));
    const { mean, variance } = equalSquares(total, shots, trials);
    const seen = draws.reduce((a, b) => a + b, 0) / draws.length;
    const spread = draws.reduce((sum, q) => sum + (q - seen) ** 2, 0) / draws.length;
    expect(Math.abs(seen - mean)).toBeLessThan(4 * Math.sqrt(variance / draws.length));
    // Four standard errors of a variance with a kurtosis of 6 or less.
    expect(Math.abs(spread / variance - 1)).toBeLessThan(4 * Math.sqrt(5 / draws.length));
    expect([...buffer]).toEqual(new Array(8).fill(0));
  });
});
