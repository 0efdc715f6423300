import { meanLimits } from '$lib/stats/moments/mean-limits';
import { describe, expect, it } from 'vitest';

describe('meanLimits', () => {
  it.each([
    // R 4.2.2: poisson.test(3)$conf.int / 1000, poisson.test(0)$conf.int / 50, binom.test(3, 4000)$conf.int * 4
    [3, 1000, null, 0.000618672122896, 0.008767273069742],
    [0, 50, null, 0, 3.68887945411 / 50],
    [3, 1000, 4, 0.000618778978632, 0.008760954651501]
  ])('is the exact interval of a total of %d in %d shots, N %s', (total, shots, trials, low, high) => {
    const limits = meanLimits(total, shots, trials, 0.95);
    expect(limits.low).toBeCloseTo(low, 12);
    expect(limits.high).toBeCloseTo(high, 12);
  });
});
