import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { describe, expect, it } from 'vitest';
import { chiSquareScore, lawByRatios } from './chi-square';

// Weldon's dice, counts of fives and sixes 0 … 12, Pearson 1900, Phil. Mag. 50:157.
const WELDON = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0];

describe('histogramSampler', () => {
  it('follows the multinomial law: every outcome of 3 cells and 4 shots', () => {
    const p = [0.2, 0.5, 0.3];
    const sampler = histogramSampler(p);
    const into = new Float64Array(3);
    const seen = new Float64Array(25);
    const law = new Float64Array(25);
    const factorial = [1, 1, 2, 6, 24];
    for (let a = 0; a <= 4; a++) {
      for (let b = 0; a + b <= 4; b++) {
        const c = 4 - a - b;
        const ways = 24 / (factorial[a] * factorial[b] * factorial[c]);
        law[a * 5 + b] = ways * p[0] ** a * p[1] ** b * p[2] ** c;
      }
    }
    const source = generator(8, 0);
    for (let i = 0; i < 200_000; i++) {
      sampler.draw(source, 4, into);
      if (into[0] + into[1] + into[2] !== 4) throw new Error(`lost a shot: ${into}`);
      seen[into[0] * 5 + into[1]]++;
    }
    expect(Math.abs(chiSquareScore(seen, law))).toBeLessThan(4);
  });

  it.each([40, 300, 26306])('gives each cell its binomial margin, %d shots', (shots) => {
    const sampler = histogramSampler(WELDON);
    const into = new Float64Array(13);
    const draws = 40_000;
    const seen = WELDON.map(() => new Float64Array(shots + 1));
    const source = generator(9, shots);
    for (let i = 0; i < draws; i++) {
      sampler.draw(source, shots, into);
      into.forEach((taken, cell) => seen[cell][taken]++);
    }
    for (const cell of [0, 4, 5, 9, 11]) {
      const p = WELDON[cell] / 26306;
      const mode = Math.floor((shots + 1) * p);
      const reach = Math.ceil(9 * Math.sqrt(shots * p) + 20);
      const [from, to] = [Math.max(0, mode - reach), Math.min(shots, mode + reach)];
      const law = lawByRatios(from, mode, to, (k) => (((shots - k) / (k + 1)) * p) / (1 - p));
      expect(Math.abs(chiSquareScore(seen[cell].subarray(from, to + 1), law))).toBeLessThan(4);
    }
    expect(seen[12][0]).toBe(draws);
  });

  it.each([1000, 2 ** 40])('has the multinomial means and covariances, %d shots', (shots) => {
    const p = [0.05, 0.4, 0.15, 0.3, 0.1];
    const sampler = histogramSampler(p);
    const into = new Float64Array(5);
    const draws = 50_000;
    const sum = new Float64Array(5);
    const product = new Float64Array(25);
    const source = generator(10, 0);
    for (let i = 0; i < draws; i++) {
      sampler.draw(source, shots, into);
      let total = 0;
      // In units of the root of the number of shots: covariances are then δ p_i − p_i p_j.
      const z = p.map((q, j) => (into[j] - shots * q) / Math.sqrt(shots));
      for (let j = 0; j < 5; j++) {
        total += into[j];
        sum[j] += z[j];
        for (let k = 0; k < 5; k++) product[j * 5 + k] += z[j] * z[k];
      }
      if (total !== shots) throw new Error(`lost a shot: ${total}`);
    }
    for (let j = 0; j < 5; j++) {
      expect(Math.abs(sum[j]) / Math.sqrt(draws * p[j] * (1 - p[j]))).toBeLessThan(4);
      for (let k = 0; k < 5; k++) {
        const covariance = (j === k ? p[j] : 0) - p[j] * p[k];
        // Variance of a product of two normal numbers: var·var + cov².
        const deviation = Math.sqrt((p[j] * (1 - p[j]) * p[k] * (1 - p[k]) + covariance ** 2) / draws);
        expect(Math.abs(product[j * 5 + k] / draws - covariance) / deviation).toBeLessThan(4);
      }
    }
  });

  it('takes any scale of weights and the smallest ones', () => {
    const source = generator(12, 0);
    const into = new Float64Array(3);
    histogramSampler([1e-300, 1, 5e-324]).draw(source, 1e15, into);
    expect([...into]).toEqual([0, 1e15, 0]);
    histogramSampler([1e308, 1e308, 1e308]).draw(source, 3e6, into);
    for (const taken of into) expect(Math.abs(taken - 1e6)).toBeLessThan(5 * Math.sqrt(2e6 / 3));
    histogramSampler([0, 3, 0]).draw(source, 7, into);
    expect([...into]).toEqual([0, 7, 0]);
    histogramSampler([1, 2, 3]).draw(source, 0, into);
    expect([...into]).toEqual([0, 0, 0]);
  });

  it('refuses what is no law and no number of shots', () => {
    for (const pmf of [[], [0, 0], [0.5, -0.1], [NaN, 1], [Infinity, 1]]) {
      expect(() => histogramSampler(pmf)).toThrow(RangeError);
    }
    const sampler = histogramSampler([1, 2]);
    const source = generator(1, 1);
    expect(() => sampler.draw(source, 1, new Float64Array(3))).toThrow(RangeError);
    for (const shots of [-1, 0.5, NaN, 2 ** 53]) {
      expect(() => sampler.draw(source, shots, new Float64Array(2))).toThrow(RangeError);
    }
  });
});
