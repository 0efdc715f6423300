import { ringCeiling } from '$lib/stats/misread/ring-ceiling';
import { ringMoments } from '$lib/stats/misread/ring-moments';
import { ringWindow } from '$lib/stats/misread/ring-window';
import { generator } from '$lib/stats/random/generator';
import { windowMoments } from '$lib/stats/truncation/window-moments';
import { describe, expect, it } from 'vitest';
import { everyReading, momentsOf } from './every-reading';
import { unevenRing } from './uneven-ring';

describe('ringCeiling', () => {
  it('is reached by the kinks it gives, at the mean asked for', () => {
    for (const bonds of [3, 4, 5, 8, 50, 101]) {
      for (const rate of [0, 0.001, 0.01, 0.09]) {
        const least = bonds * 2 * rate * (1 - rate);
        for (const share of [0.002, 0.02, 0.1, 0.3, 0.5, ...(bonds % 2 === 0 ? [0.8, 0.98, 0.998] : [])]) {
          const mean = least + share * (bonds - 2 * least);
          const { variance, kinks } = ringCeiling(bonds, rate)(mean);
          const got = windowMoments(
            ringWindow(
              Array.from(kinks!, (p) => ({ p, trials: 1 })),
              rate
            )
          );
          expect(Math.abs(got.mean - mean), `N = ${bonds}, ε = ${rate}, ${share}`).toBeLessThan(1e-9 * bonds);
          expect(Math.abs(got.variance - variance)).toBeLessThan(1e-9 * bonds);
        }
      }
    }
  });

  it('is passed by no other kinks of that mean, up to half the bonds: random ones, N = 3 … 9', () => {
    const random = generator(41, 0);
    let nearest = Infinity;
    for (let repeat = 0; repeat < 20000; repeat++) {
      const bonds = 3 + Math.floor(random.next() * 7);
      const rate = repeat % 3 === 0 ? 0 : random.next() * 0.0917;
      const wild = random.next() ** 2;
      const level = random.next() ** 3;
      const p = Array.from({ length: bonds }, () =>
        random.next() < 0.2 * wild ? 0 : Math.max(0, level + wild * (random.next() - level))
      );
      const { mean, variance } = unevenRing(p, rate);
      if (bonds % 2 === 1 && mean > bonds / 2) continue;
      const ceiling = ringCeiling(bonds, rate)(mean).variance;
      expect(variance, `${p} at ${rate}`).toBeLessThanOrEqual(ceiling * (1 + 1e-10) + 1e-12);
      if (ceiling > 0.01) nearest = Math.min(nearest, 1 - variance / ceiling);
    }
    expect(nearest).toBeLessThan(1e-3);
  });

  it('is more than equal bonds vary where a few kinks are read with misreads', () => {
    // SciPy's L-BFGS-B over the p of 8 bonds from eight starts ended at two neighbours that share all kinks.
    const few = 8 * 2 * 0.09 * 0.91 + 0.1 * (1 - 2 * 0.09) ** 2;
    const { variance, kinks } = ringCeiling(8, 0.09)(few);
    expect([...kinks!].filter((p) => p > 0)).toHaveLength(2);
    const counted = momentsOf(everyReading([...kinks!], 0.09, true));
    expect(counted.mean).toBeCloseTo(few, 10);
    expect(counted.variance).toBeCloseTo(variance, 10);
  });

  it('is passed by uneven kinks on more than half of an odd number of bonds, where it is not to be used', () => {
    // Found by SciPy's L-BFGS-B: five bonds, ε = 0.0917.
    const p = [1, 1, 0.4402, 0.4629, 0.5828];
    const { mean, variance } = momentsOf(everyReading(p, 0.0917, true));
    expect(mean).toBeGreaterThan(2.5);
    expect(variance / ringCeiling(5, 0.0917)(mean).variance).toBeCloseTo(1.0348, 3);
  });

  it('moves a mean that no kinks give to the nearest', () => {
    const none = ringMoments(20, 0, 0.01);
    expect(ringCeiling(20, 0.01)(none.mean / 2).variance).toBeCloseTo(none.variance, 10);
  });
});

describe('unevenRing', () => {
  it('agrees with counting every even chain and every reading', () => {
    for (const p of [
      [0.1, 0.4, 0.02],
      [0.3, 0, 0.9, 0.2, 0.7, 0.05]
    ]) {
      const want = momentsOf(everyReading(p, 0.06, true));
      const got = unevenRing(p, 0.06);
      expect(got.mean).toBeCloseTo(want.mean, 12);
      expect(got.variance).toBeCloseTo(want.variance, 12);
    }
  });
});
