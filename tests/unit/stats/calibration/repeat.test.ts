import { describe, expect, it } from 'vitest';
import { repeat } from '$lib/stats/calibration/repeat';
import { truthSetting, violationSetting } from '$lib/stats/calibration/setting';
import { truths } from '$lib/stats/calibration/truths';
import { deadShots } from '$lib/stats/calibration/violations/dead-shots';

const equal = truthSetting(truths.find(({ id }) => id === 'equal-12')!);
const dead = violationSetting(deadShots, 0.03);
const quick = { resamples: 99, full: 99, alpha: 0.01, seed: 1 };

describe('repeat', () => {
  it('depends on setting, shots, index and seed alone', async () => {
    const first = await repeat(equal, 300, 0, quick);
    expect(await repeat(equal, 300, 0, quick)).toEqual(first);
    expect(await repeat(equal, 300, 1, quick)).not.toEqual(first);
    expect(await repeat(equal, 300, 0, { ...quick, seed: 2 })).not.toEqual(first);
  });

  it('rules out at α exactly when the full number of resamples does', async () => {
    const alpha = 0.05;
    let ruledOut = 0;
    for (let index = 0; index < 9; index++) {
      const short = await repeat(dead, 150, index, { resamples: 39, full: 299, alpha, seed: 3 });
      const whole = await repeat(dead, 150, index, { resamples: 299, full: 299, alpha, seed: 3 });
      expect(short.ruledOutFrom <= alpha).toBe(whole.ruledOutFrom <= alpha);
      if (whole.ruledOutFrom <= alpha) ruledOut++;
      // 39 resamples alone cannot: 1/40 times five tests and more is above 0.05.
      const alone = await repeat(dead, 150, index, { resamples: 39, full: 39, alpha, seed: 3 });
      for (const p of Object.entries(alone.p))
        if (p[0] !== 'certificate') expect(p[1]).toBeGreaterThanOrEqual(1 / 40);
    }
    expect(ruledOut).toBeGreaterThan(0);
    expect(ruledOut).toBeLessThan(9);
  });

  it('knows whether intervals hold the law, when there is one', async () => {
    expect(Object.keys((await repeat(equal, 300, 0, quick)).covered!)).toEqual([
      'mean',
      'variance',
      'third',
      'fourth',
      'dispersion'
    ]);
    expect((await repeat(dead, 300, 0, quick)).covered).toBeNull();
  });
});
