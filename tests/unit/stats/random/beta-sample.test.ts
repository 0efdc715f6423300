import { betaSample } from '$lib/stats/random/beta-sample';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

const DRAWS = 100_000;

function score(a: number, b: number, cdf: (x: number) => number): number {
  const seen = new Float64Array(40);
  const source = generator(77, Math.round(1000 * a));
  for (let i = 0; i < DRAWS; i++) seen[Math.min(39, Math.floor(40 * cdf(betaSample(source, a, b))))]++;
  return chiSquareScore(seen, new Float64Array(40).fill(1 / 40));
}

describe('betaSample', () => {
  // Distribution functions in closed form.
  it.each([
    [1, 1, (x: number) => x],
    [3, 1, (x: number) => x ** 3],
    [1, 0.2, (x: number) => 1 - (1 - x) ** 0.2],
    [0.1, 1, (x: number) => x ** 0.1],
    [0.5, 0.5, (x: number) => (2 / Math.PI) * Math.asin(Math.sqrt(x))],
    [2, 2, (x: number) => 3 * x * x - 2 * x ** 3],
    [2, 50, (x: number) => 1 - (1 - x) ** 51 - 51 * x * (1 - x) ** 50]
  ])('follows Beta(%d, %d)', (a, b, cdf) => {
    expect(Math.abs(score(a, b, cdf))).toBeLessThan(4);
  });

  it('has the mean and variance of beta-binomial overdispersion: p = 0.15, ρ = 0.004', () => {
    const scale = 1 / 0.004 - 1;
    const [a, b] = [0.15 * scale, 0.85 * scale];
    const source = generator(78, 0);
    let [sum, square] = [0, 0];
    for (let i = 0; i < DRAWS; i++) {
      const d = betaSample(source, a, b) - 0.15;
      sum += d;
      square += d * d;
    }
    const variance = 0.15 * 0.85 * 0.004;
    expect(Math.abs(sum) / Math.sqrt(variance * DRAWS)).toBeLessThan(4);
    // Kurtosis is close to 3 for such shapes: relative deviation of a variance √(2/draws).
    expect(Math.abs(square / DRAWS / variance - 1)).toBeLessThan(4 * Math.sqrt(2.1 / DRAWS));
  });

  it('never gives 0/0 for tiny shapes: a coin with the odds of the means', () => {
    const source = generator(79, 0);
    let ones = 0;
    for (let i = 0; i < 20_000; i++) {
      const x = betaSample(source, 3e-5, 1e-5);
      expect(x >= 0 && x <= 1).toBe(true);
      if (x > 0.5) ones++;
    }
    expect(Math.abs(ones - 15_000) / Math.sqrt(20_000 * 0.75 * 0.25)).toBeLessThan(4);
  });

  it('refuses other shapes', () => {
    for (const shape of [0, -1, NaN, Infinity]) {
      expect(() => betaSample(generator(1, 1), shape, 1)).toThrow(RangeError);
      expect(() => betaSample(generator(1, 1), 1, shape)).toThrow(RangeError);
    }
  });
});
