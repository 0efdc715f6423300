import { ringMoments } from '$lib/stats/misread/ring-moments';
import { ringNeeded } from '$lib/stats/misread/ring-needed';
import { describe, expect, it } from 'vitest';
import { everyReading, momentsOf } from './every-reading';

describe('ringNeeded', () => {
  it('gives back the rate of moments that were counted one by one', () => {
    for (const bonds of [5, 8]) {
      for (const rate of [0.004, 0.03]) {
        const { mean, variance } = momentsOf(everyReading(new Array<number>(bonds).fill(0.06), rate, true));
        expect(ringNeeded(mean, variance, bonds)).toBeCloseTo(rate, 9);
      }
    }
    const { mean, variance } = ringMoments(100, 0.05, 0.01);
    expect(ringNeeded(mean, variance, 100)).toBeCloseTo(0.01, 10);
  });

  it('is 0 where none is needed and null where none would do', () => {
    const { mean, variance } = ringMoments(100, 0.05, 0);
    expect(ringNeeded(mean, variance * 0.999, 100)).toBe(0);
    expect(ringNeeded(mean, 60 * variance, 100)).toBeNull();
  });
});
