import { describe, expect, it } from 'vitest';
import { momentBody } from '$lib/stats/bounds/moment-body';
import { countLimits } from '$lib/stats/cumulants-only/count-limits';
import { leastOnUnit } from '$lib/stats/cumulants-only/least-on-unit';
import { momentLimits } from '$lib/stats/cumulants-only/moment-limits';
import { trialLimits } from '$lib/stats/cumulants-only/trial-limits';
import { generator } from '$lib/stats/random/generator';

describe('momentLimits', () => {
  it('of the uniform law on [0, 1] hold its moments 1/2, 1/3, 1/4, 1/5 strictly', () => {
    const moments = [1, 1 / 2, 1 / 3, 1 / 4, 1 / 5];
    momentLimits(moments, 1).forEach(({ low, high }, i) => {
      expect(low).toBeLessThan(moments[i + 1]);
      expect(high).toBeGreaterThan(moments[i + 1]);
    });
    // By hand: m4 between 7/36 (the determinant of [1 1/2 1/3; 1/2 1/3 1/4; 1/3 1/4 m4] is 0) and 1/4 − (1/12)²/(1/6).
    const last = momentLimits(moments, 1)[3];
    expect(last.low).toBeCloseTo(7 / 36, 14);
    expect(last.high).toBeCloseTo(1 / 4 - 1 / 24, 14);
  });

  it('are reached by one and by two points', () => {
    // Half at 0.2 and half at 0.6: two points inside give the least fourth moment.
    const moments = [0, 1, 2, 3, 4].map((r) => (0.2 ** r + 0.6 ** r) / 2);
    expect(momentLimits(moments, 1)[3].low).toBeCloseTo(moments[4], 14);
  });
});

describe('trialLimits', () => {
  it('agrees with the three conditions of the engine', () => {
    const random = generator(5, 2);
    for (let round = 0; round < 300; round++) {
      const trials = round % 3 === 0 ? null : 1 + Math.floor(20 * random.next());
      const mean = random.next() * (trials ?? 9);
      const variance = random.next() * mean * (1 - mean / (trials ?? Infinity));
      const [ceiling, floor, roof] = momentBody(trials, { mean, variance, third: 0 });
      const [, second, third] = trialLimits(trials, [mean, variance, 0]);
      expect(second.high).toBeCloseTo(ceiling.limit, 10);
      expect(third.low).toBeCloseTo(floor.limit, 10);
      expect(third.high).toBeCloseTo(roof.limit, 10);
    }
  });

  it('meets Poisson and equal trials at its edges', () => {
    // All cumulants of a Poisson law are equal, and it is the only law with that mean and variance.
    expect(trialLimits(null, [3, 3, 3, 3]).slice(1)).toEqual([
      { low: 0, high: 3 },
      { low: 3, high: 3 },
      { low: 3, high: 3 }
    ]);
    // Bin(10, 0.3): 3, 2.1, 0.84, −0.546 = 2.1(1 − 6·0.21).
    const limits = trialLimits(10, [3, 2.1, 0.84, -0.546]);
    expect(limits[1].high).toBeCloseTo(2.1, 12);
    expect(limits[2].low).toBeCloseTo(0.84, 10);
  });
});

describe('countLimits', () => {
  it('holds every law on 0 … N, drawn at random', () => {
    const random = generator(6, 2);
    for (let round = 0; round < 500; round++) {
      const top = 1 + Math.floor(8 * random.next());
      const weights = Array.from({ length: top + 1 }, () => random.next() ** 4);
      const sum = weights.reduce((a, b) => a + b, 0);
      const mean = weights.reduce((s, w, n) => s + (w / sum) * n, 0);
      const central = (r: number) => weights.reduce((s, w, n) => s + (w / sum) * (n - mean) ** r, 0);
      const cumulants = [mean, central(2), central(3), central(4) - 3 * central(2) ** 2];
      for (const trials of [top, null])
        countLimits(trials, cumulants).forEach(({ low, high }, i) => {
          expect(cumulants[i]).toBeGreaterThan(low - 1e-7);
          expect(cumulants[i]).toBeLessThan(high + 1e-7);
        });
    }
  });

  it('knows that counts are whole, and how far 0 … N lets them scatter', () => {
    expect(countLimits(10, [3.5, 0.2])[1]).toEqual({ low: 0.25, high: 3.5 * 6.5 });
  });
});

describe('leastOnUnit', () => {
  it('is where a fine grid finds it', () => {
    const random = generator(7, 2);
    for (let round = 0; round < 300; round++) {
      const a = Array.from({ length: 5 }, () => random.next() - 0.5);
      const value = (x: number) => a.reduceRight((sum, c) => sum * x + c, 0);
      let best = Infinity;
      for (let i = 0; i <= 1000; i++) best = Math.min(best, value(i / 1000));
      expect(value(leastOnUnit(a))).toBeLessThanOrEqual(best + 1e-12);
    }
  });

  it('of a plain slope lies at an end', () => {
    expect(leastOnUnit([0, 1, 0, 0, 0])).toBe(0);
    expect(leastOnUnit([0, -1, 0, 0, 0])).toBe(1);
  });
});
