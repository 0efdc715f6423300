import { chainMoments } from '$lib/stats/misread/chain-moments';
import { misreadCeiling } from '$lib/stats/misread/misread-ceiling';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

const blocks = (p: ArrayLike<number>) => Array.from(p, (one) => ({ p: one, trials: 1 }));

describe('misreadCeiling', () => {
  it('is reached by the kinks it gives, at the mean asked for', () => {
    for (const bonds of [1, 2, 3, 4, 7, 50, 400]) {
      for (const rate of [0, 0.001, 0.01, 0.05, 0.09]) {
        const least = bonds * 2 * rate * (1 - rate);
        for (const share of [0, 0.001, 0.02, 0.1, 0.3, 0.5, 0.8, 0.999]) {
          const mean = least + share * (bonds - 2 * least);
          const { variance, kinks } = misreadCeiling(bonds, rate)(mean);
          for (const p of kinks!) expect(p >= -1e-12 && p <= 1 + 1e-12).toBe(true);
          const got = chainMoments(blocks(kinks!), rate);
          expect(Math.abs(got.mean - mean)).toBeLessThan(1e-10 * bonds);
          expect(Math.abs(got.variance - variance)).toBeLessThan(1e-10 * bonds);
        }
      }
    }
  });

  it('is not passed by any other kinks of that mean: random ones, and small changes of its own', () => {
    const random = generator(11, 0);
    let nearest = Infinity;
    for (let repeat = 0; repeat < 4000; repeat++) {
      const bonds = 2 + Math.floor(random.next() * 9);
      const rate = random.next() * 0.0917;
      // From all alike to wild, and often with kinks that are impossible.
      const wild = random.next() ** 2;
      const level = random.next() ** 2;
      const p = Array.from({ length: bonds }, () =>
        random.next() < 0.1 ? 0 : level + wild * (random.next() - level)
      );
      const { mean, variance } = chainMoments(blocks(p), rate);
      const ceiling = misreadCeiling(bonds, rate)(mean);
      expect(variance).toBeLessThanOrEqual(ceiling.variance + 1e-12);
      nearest = Math.min(nearest, ceiling.variance - variance);
      // Moving kinks from one bond to another keeps the mean.
      const moved = Array.from(ceiling.kinks!);
      const [from, to] = [Math.floor(random.next() * bonds), Math.floor(random.next() * bonds)];
      const step = Math.min(moved[from], 1 - moved[to], 10 ** (-4 * random.next()));
      moved[from] -= step;
      moved[to] += step;
      expect(chainMoments(blocks(moved), rate).variance).toBeLessThanOrEqual(ceiling.variance + 1e-12);
    }
    expect(nearest).toBeLessThan(1e-3);
  });

  it('bounds the variance for large rates too', () => {
    const random = generator(12, 0);
    for (let repeat = 0; repeat < 2000; repeat++) {
      const bonds = 1 + Math.floor(random.next() * 10);
      const rate = 0.0918 + random.next() * 0.4;
      const p = Array.from({ length: bonds }, () =>
        random.next() < 0.5 ? Math.round(random.next()) : random.next()
      );
      const { mean, variance } = chainMoments(blocks(p), rate);
      expect(variance).toBeLessThanOrEqual(misreadCeiling(bonds, rate)(mean).variance + 1e-12);
    }
  });

  it('is the plain ceiling without misreads', () => {
    for (const mean of [0, 0.3, 7, 19.5, 20]) {
      expect(misreadCeiling(20, 0)(mean).variance).toBeCloseTo(mean * (1 - mean / 20), 12);
    }
  });
});
