import { chainWindow } from '$lib/stats/misread/chain-window';
import { kinkMeanLimits } from '$lib/stats/misread/kink-mean-limits';
import { misreadCertificate } from '$lib/stats/misread/misread-certificate';
import { ringWindow } from '$lib/stats/misread/ring-window';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { describe, expect, it } from 'vitest';

function drawn(values: Float64Array, first: number, shots: number, seed: number): [number, number][] {
  const into = new Float64Array(values.length);
  histogramSampler(values).draw(generator(seed, 1), shots, into);
  return Array.from(into, (h, i) => [first + i, h] as [number, number]).filter(([, h]) => h > 0);
}

describe('misreadCertificate', () => {
  it('stays silent for independent kinks read with misreads', () => {
    const truths = [
      { blocks: [{ p: 0.05, trials: 40 }], rate: 0.02 },
      {
        blocks: [
          { p: 0.9, trials: 3 },
          { p: 0.01, trials: 37 }
        ],
        rate: 0.03
      },
      { blocks: [{ p: 0, trials: 40 }], rate: 0.01 }
    ];
    for (const { blocks, rate } of truths) {
      const { first, values } = chainWindow(blocks, rate, 1e-18, 1);
      let low = 0;
      for (let seed = 0; seed < 60; seed++) {
        const counts = drawn(values, first, 3000, seed);
        const found = misreadCertificate({ counts, shots: 3000, bonds: 40, rate });
        if (found && found.p <= 0.05) low++;
      }
      expect(low).toBeLessThanOrEqual(2);
    }
  });

  it('speaks where one shot in two hundred has most bonds broken', () => {
    const { first, values } = chainWindow([{ p: 0.05, trials: 40 }], 0.01, 1e-18, 1);
    const counts = drawn(values, first, 3980, 5);
    const bursts = misreadCertificate({ counts: [...counts, [25, 20]], shots: 4000, bonds: 40, rate: 0.01 })!;
    expect(bursts.side).toBe('high');
    expect(bursts.p).toBeLessThan(2e-6);
    expect(bursts.shots).toBe(20);
  });
});

describe('misreadCertificate of a ring', () => {
  const law = (p: number, rate: number) => ringWindow([{ p, trials: 40 }], rate, 1);

  it('stays silent for independent kinks read with misreads', () => {
    for (const [p, rate] of [
      [0.05, 0.02],
      [0, 0.01],
      [0.4, 0.005]
    ]) {
      const { first, values } = law(p, rate);
      let low = 0;
      for (let seed = 0; seed < 60; seed++) {
        const counts = drawn(values, first, 3000, seed);
        const found = misreadCertificate({ counts, shots: 3000, bonds: 40, rate, ring: true });
        if (found && found.p <= 0.05) low++;
      }
      expect(low).toBeLessThanOrEqual(2);
    }
  });

  it('speaks where one shot in two hundred has most bonds broken', () => {
    const { first, values } = law(0.05, 0.01);
    const counts = drawn(values, first, 3980, 5);
    const bursts = misreadCertificate({
      counts: [...counts, [30, 20]],
      shots: 4000,
      bonds: 40,
      rate: 0.01,
      ring: true
    })!;
    expect(bursts.side).toBe('high');
    expect(bursts.p).toBeLessThan(2e-6);
    expect(bursts.shots).toBe(20);
  });

  it('keeps the mean of the true kinks within its limits', () => {
    const { first, values } = law(0.05, 0.02);
    // Kinks of 40 equal bonds with an even total: half the even part of a binomial's mean.
    const m = 0.9;
    const kinks = 20 * (1 - (m + m ** 39) / (1 + m ** 40));
    let misses = 0;
    for (let seed = 0; seed < 400; seed++) {
      const counts = drawn(values, first, 500, seed);
      const mean = counts.reduce((sum, [n, h]) => sum + n * h, 0) / 500;
      const { low, high } = kinkMeanLimits(mean, 500, 40, 0.02, 0.1, true);
      if (low > kinks || high < kinks) misses++;
    }
    // 10 % may miss. The variance allowed for is about twice that of single kinks, so hardly any does.
    expect(misses).toBeLessThan(10);
  });
});

describe('kinkMeanLimits', () => {
  it('misses far less often than it may', () => {
    const { first, values } = chainWindow([{ p: 0.04, trials: 30 }], 0.02, 1e-18, 1);
    let misses = 0;
    for (let seed = 0; seed < 400; seed++) {
      const counts = drawn(values, first, 500, seed);
      const mean = counts.reduce((sum, [n, h]) => sum + n * h, 0) / 500;
      const { low, high } = kinkMeanLimits(mean, 500, 30, 0.02, 0.1);
      if (low > 1.2 || high < 1.2) misses++;
    }
    // 10 % may miss; Bernstein's constant leaves about half of that.
    expect(misses).toBeLessThan(40);
    expect(misses).toBeGreaterThan(0);
  });
});
