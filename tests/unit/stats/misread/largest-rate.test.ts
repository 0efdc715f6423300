import { largestRate, misreadsAlone } from '$lib/stats/misread/largest-rate';
import { describe, expect, it } from 'vitest';
import { everyReading, momentsOf } from './every-reading';

describe('misreadsAlone', () => {
  it('is what counting every reading of a chain without kinks gives', () => {
    for (const rate of [0.01, 0.2, 0.5]) {
      const want = momentsOf(everyReading([0, 0, 0, 0, 0, 0], rate));
      const { mean, variance } = misreadsAlone(rate, 6, 'open-bonds');
      expect(mean).toBeCloseTo(want.mean, 13);
      expect(variance).toBeCloseTo(want.variance, 13);
    }
  });

  it('is what counting every reading of a ring without kinks gives', () => {
    const rate = 0.13;
    const N = 6;
    let mean = 0;
    let square = 0;
    for (let reading = 0; reading < 2 ** N; reading++) {
      let chance = 1;
      let kinks = 0;
      for (let site = 0; site < N; site++) {
        const here = (reading >> site) & 1;
        chance *= here ? rate : 1 - rate;
        if (here !== ((reading >> ((site + 1) % N)) & 1)) kinks++;
      }
      mean += chance * kinks;
      square += chance * kinks ** 2;
    }
    const found = misreadsAlone(rate, N, 'ring-bonds');
    expect(found.mean).toBeCloseTo(mean, 13);
    expect(found.variance).toBeCloseTo(square - mean ** 2, 12);
  });

  it('is binomial on sites', () => {
    const { mean, variance } = misreadsAlone(0.2, 50, 'sites');
    expect(mean).toBeCloseTo(10, 13);
    expect(variance).toBeCloseTo(8, 13);
  });
});

describe('largestRate', () => {
  it('solves mean = what misreads alone show, less five standard errors', () => {
    for (const geometry of ['open-bonds', 'ring-bonds', 'sites'] as const) {
      const rate = largestRate(3, 100, 10_000, geometry);
      const { mean, variance } = misreadsAlone(rate, 100, geometry);
      expect(Math.abs(mean - 5 * Math.sqrt(variance / 10_000) - 3)).toBeLessThan(1e-9);
    }
    // Sites, many shots: the share of sites read as defects itself.
    expect(largestRate(3, 100, 1e15, 'sites')).toBeCloseTo(0.03, 6);
    // Bonds: 2ε(1 − ε) = 0.03, so ε = (1 − √0.94)/2.
    expect(largestRate(3, 100, 1e15, 'open-bonds')).toBeCloseTo((1 - Math.sqrt(0.94)) / 2, 6);
  });

  it('is the same for counts mirrored, allows all at half, and none of an impossible mean', () => {
    expect(largestRate(97, 100, 500, 'sites')).toBeCloseTo(largestRate(3, 100, 500, 'sites'), 12);
    expect(largestRate(50, 100, 500, 'open-bonds')).toBe(0.5);
    expect(largestRate(0, 100, 1e6, 'sites')).toBeLessThan(1e-6);
  });
});
