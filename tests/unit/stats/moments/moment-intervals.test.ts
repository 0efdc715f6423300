import { momentIntervals } from '$lib/stats/moments/moment-intervals';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { describe, expect, it } from 'vitest';

const options = { resamples: 999, seed: 1 };
const column = (shots: number[]) => shots.map((h, n): [number, number] => [n, h]);
// Pearson 1900, Phil. Mag. 50:157; Student 1907, Biometrika 5:351; Greenwood & Yule 1920, JRSS 83:255.
const WELDON = column([185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0]);
const YEAST = column([213, 128, 37, 18, 3, 1]);
const ACCIDENTS = column([447, 132, 42, 21, 3, 2]);

describe('momentIntervals', () => {
  it('gives the published moments, each inside its interval', () => {
    // science.md 11: mean 4.052383; var/mean 1.192276 and 1.487241.
    expect(momentIntervals(WELDON, 12, options).mean.value).toBeCloseTo(4.052383, 6);
    expect(momentIntervals(YEAST, null, options).fano.value).toBeCloseTo(1.192276, 6);
    const accidents = momentIntervals(ACCIDENTS, null, options);
    expect(accidents.dispersion.value).toBeCloseTo(1.487241, 6);
    expect(accidents.dispersion.low).toBeGreaterThan(1);
    for (const name of ['mean', 'variance', 'third', 'fourth', 'fano', 'dispersion'] as const) {
      const { value, low, high } = accidents[name];
      expect(low! < value! && value! < high!).toBe(true);
    }
  });

  it('has the textbook interval for the mean of many shots', () => {
    const { mean, variance } = momentIntervals(WELDON, 12, { resamples: 9999, seed: 1 });
    const half = 1.959964 * Math.sqrt(variance.value! / 26306);
    // The quantiles of 9999 resamples are known to about 1.5 % of the half width.
    expect(Math.abs(mean.high! - mean.value! - half)).toBeLessThan(0.05 * half);
    expect(Math.abs(mean.value! - mean.low! - half)).toBeLessThan(0.05 * half);
  });

  it('repeats itself with the seed and not with another', () => {
    expect(momentIntervals(YEAST, null, options)).toEqual(
      momentIntervals([...YEAST].reverse(), null, options)
    );
    expect(momentIntervals(YEAST, null, options)).not.toEqual(
      momentIntervals(YEAST, null, { ...options, seed: 2 })
    );
  });

  it('is as narrow as 2^40 shots make it', () => {
    const { dispersion } = momentIntervals(
      [
        [0, 2 ** 38],
        [1, 2 ** 39],
        [2, 2 ** 38]
      ],
      12,
      options
    );
    expect(dispersion.value).toBeCloseTo(0.5 / (1 - 1 / 12), 10);
    expect(dispersion.high! - dispersion.low!).toBeGreaterThan(1e-7);
    expect(dispersion.high! - dispersion.low!).toBeLessThan(1e-5);
  });

  it('does not take what was never seen for impossible: 3 single defects in 1000 shots', () => {
    const { mean, dispersion } = momentIntervals(
      [
        [0, 997],
        [1, 3]
      ],
      null,
      options
    );
    expect(dispersion.high).toBeGreaterThan(1.5);
    // R 4.2.2: poisson.test(3)$conf.int[2] / 1000
    expect(mean.high).toBeCloseTo(0.008767273069742, 12);
  });

  it('gives values without limits where nothing varies', () => {
    const none = (value: number | null) => ({ value, low: null, high: null });
    const alike = momentIntervals([[3, 50]], 12, options);
    expect([alike.mean, alike.variance, alike.dispersion]).toEqual([none(3), none(0), none(0)]);
    const one = momentIntervals([[3, 1]], 12, options);
    expect([one.mean, one.variance, one.fano]).toEqual([none(3), none(null), none(null)]);
    const empty = momentIntervals([[0, 9]], 12, options);
    expect([empty.mean, empty.fano, empty.dispersion]).toEqual([none(0), none(null), none(null)]);
    const full = momentIntervals([[12, 9]], 12, options);
    expect([full.mean, full.fano, full.dispersion, full.ceiling]).toEqual([none(12), none(0), none(null), 0]);
    expect(momentIntervals([[0, 9]], 0, options).ceiling).toBe(0);
  });

  it('knows too few shots: third from three, fourth from four', () => {
    const two = momentIntervals(
      [
        [0, 1],
        [4, 1]
      ],
      4,
      options
    );
    expect([two.third.value, two.fourth.value]).toEqual([null, null]);
    // The estimate 8 passes the largest possible 4; the limit does not hide it.
    expect([two.dispersion.value, two.dispersion.high]).toEqual([8, 8]);
    const three = momentIntervals(
      [
        [1, 1],
        [2, 1],
        [3, 1]
      ],
      null,
      options
    );
    expect([three.third.value, three.fourth.value]).toEqual([0, null]);
  });

  it('claims nothing about dispersion from single trials', () => {
    const { dispersion, mean } = momentIntervals(
      [
        [0, 30],
        [1, 20]
      ],
      1,
      options
    );
    expect(dispersion).toEqual({ value: 50 / 49, low: null, high: null });
    expect(mean.low! < 0.4 && mean.high! > 0.4).toBe(true);
  });

  it('refuses counts that cannot be', () => {
    expect(() => momentIntervals([], null, options)).toThrow(RangeError);
    expect(() =>
      momentIntervals(
        [
          [-1, 2],
          [0, 1]
        ],
        null,
        options
      )
    ).toThrow(RangeError);
    expect(() =>
      momentIntervals(
        [
          [13, 2],
          [0, 1]
        ],
        12,
        options
      )
    ).toThrow(RangeError);
  });

  // The whole table is in the docstring; these are two of its rows small enough for every run.
  it.each([
    ['Poisson(0.5), 40 shots', poisson(0.5), null, 40, 1],
    ['beta-binomial of dispersion 1.1, 300 shots', betaBinomial(64, 0.15, 0.1 / 63), 64, 300, 1.1]
  ])('covers: %s', (_, law, trials, shots, truth) => {
    const sampler = histogramSampler(law);
    const drawn = new Float64Array(law.length);
    const source = generator(4, 0);
    const runs = 400;
    let [above, below] = [0, 0];
    for (let i = 0; i < runs; i++) {
      sampler.draw(source, shots, drawn);
      const counts = Array.from(drawn, (h, n): [number, number] => [n, h]);
      const { low, high } = momentIntervals(counts, trials, { resamples: 399, seed: i }).dispersion;
      if (low! > truth) above++;
      if (high! < truth) below++;
    }
    // 2.5 % of 400 is 10; three standard deviations of it are 9.4.
    expect(above).toBeLessThan(20);
    expect(below).toBeLessThan(20);
    expect(above + below).toBeGreaterThan(0);
  });
});

function poisson(mean: number): number[] {
  const law = [1];
  for (let n = 0; n < 30; n++) law.push((law[n] * mean) / (n + 1));
  return law;
}

function betaBinomial(trials: number, p: number, correlation: number): number[] {
  const [a, b] = [p * (1 / correlation - 1), (1 - p) * (1 / correlation - 1)];
  const law = [1];
  for (let n = 0; n < trials; n++) {
    law.push((((law[n] * (trials - n)) / (n + 1)) * (a + n)) / (b + trials - n - 1));
  }
  return law;
}
