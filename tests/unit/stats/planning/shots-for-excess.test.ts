import { describe, expect, it } from 'vitest';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { excessOfShots, shotsForExcess } from '$lib/stats/planning/shots-for-excess';
import { generator } from '$lib/stats/random/generator';

const usual = { alpha: 0.05, power: 0.8 };

describe('shotsForExcess', () => {
  it('is (1.645 + 0.842)²(2 + κ4/κ2²)/excess² by hand', () => {
    // Poisson of mean 4: κ4/κ2² = 1/4. 2.48647… = 1.644854 + 0.841621 (tables of the normal law).
    expect(shotsForExcess(4, null, 0.1, usual)).toBe(Math.ceil((2.25 * 2.486475 ** 2) / 0.01));
    expect(excessOfShots(4, null, 1392, usual)).toBeCloseTo(0.1, 4);
  });

  it('refuses what has no meaning', () => {
    expect(shotsForExcess(0, 10, 0.1, usual)).toBeNull();
    expect(shotsForExcess(4, 10, 0, usual)).toBeNull();
    expect(shotsForExcess(4, 10, 0.1, { alpha: 0.05, power: 0.04 })).toBeNull();
  });

  it('is what a test on simulated shots needs: 80 of 100 see the excess', () => {
    const [trials, p, excess] = [32, 0.15, 0.12];
    const shots = shotsForExcess(trials * p, trials, excess, usual)!;
    const cut = 1 + (1.644854 / 2.486475) * excess;
    let seen = 0;
    for (let r = 0; r < 400; r++) {
      const { counts } = betaBinomial(generator(6, r), shots, trials, p, excess / (trials - 1));
      let [sum, square] = [0, 0];
      for (const [n, h] of counts) [sum, square] = [sum + n * h, square + n * n * h];
      const mean = sum / shots;
      const variance = (square - shots * mean * mean) / (shots - 1);
      if (variance / (mean * (1 - mean / trials)) > cut) seen++;
    }
    // 320 ± 8; the spread is a little larger under the excess itself.
    expect(seen).toBeGreaterThan(280);
    expect(seen).toBeLessThan(352);
  });
});
