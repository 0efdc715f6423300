import { gammaSample } from '$lib/stats/random/gamma-sample';
import { generator } from '$lib/stats/random/generator';
import { logGammaSample } from '$lib/stats/random/log-gamma-sample';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

const DRAWS = 100_000;

/** P(X ≤ x) for a whole shape: 1 − e^{−x} Σ_{k<a} x^k/k! (Erlang). */
function erlang(shape: number, x: number): number {
  let [term, sum] = [1, 0];
  for (let k = 0; k < shape; k++) {
    sum += term;
    term *= x / (k + 1);
  }
  return 1 - Math.exp(-x) * sum;
}

describe('gammaSample', () => {
  it.each([1, 2, 7, 40])('follows the Erlang law of shape %d', (shape) => {
    const seen = new Float64Array(40);
    const source = generator(55, shape);
    for (let i = 0; i < DRAWS; i++) seen[Math.floor(40 * erlang(shape, gammaSample(source, shape)))]++;
    expect(Math.abs(chiSquareScore(seen, new Float64Array(40).fill(1 / 40)))).toBeLessThan(4);
  });

  it.each([0.3, 0.9, 1.5, 1e6])('has mean and variance equal to its shape %d', (shape) => {
    const source = generator(56, 0);
    let [sum, square] = [0, 0];
    for (let i = 0; i < DRAWS; i++) {
      const z = (gammaSample(source, shape) - shape) / Math.sqrt(shape);
      sum += z;
      square += z * z;
    }
    // Variance of z² is 2 + 6/shape.
    expect(Math.abs(sum) / Math.sqrt(DRAWS)).toBeLessThan(4);
    expect(Math.abs(square - DRAWS) / Math.sqrt((2 + 6 / shape) * DRAWS)).toBeLessThan(4);
  });

  it('keeps logarithms of draws far below the smallest double', () => {
    // For a tiny shape a, −a·ln X is exponential with mean 1: P(X < x) ≈ x^a.
    const source = generator(57, 0);
    const seen = new Float64Array(20);
    for (let i = 0; i < DRAWS; i++) {
      seen[Math.min(19, Math.floor(20 * Math.exp(1e-6 * logGammaSample(source, 1e-6))))]++;
    }
    expect(Math.abs(chiSquareScore(seen, new Float64Array(20).fill(1 / 20)))).toBeLessThan(4);
  });

  it('refuses other shapes', () => {
    for (const shape of [0, -1, NaN, Infinity]) {
      expect(() => gammaSample(generator(1, 1), shape)).toThrow(RangeError);
    }
  });
});
