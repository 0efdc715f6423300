import { lawMoments } from '$lib/stats/laws/law-moments';
import { landauZenerLaw } from '$lib/stats/references/landau-zener-law';
import { describe, expect, it } from 'vitest';

describe('landauZenerLaw', () => {
  it('has p_j = exp(−a k_j²), k_j = (2j−1)π/(2N)', () => {
    const { levels, poissonPart } = landauZenerLaw(3, 0.5);
    expect(poissonPart).toBe(0);
    expect(levels.map(({ trials }) => trials)).toEqual([1, 1, 1]);
    [1, 3, 5].forEach((odd, j) =>
      expect(levels[j].p).toBeCloseTo(Math.exp(-0.5 * ((odd * Math.PI) / 6) ** 2), 14)
    );
  });

  it('always has N modes, the hopeless ones written as impossible', () => {
    for (const a of [0, 1, 50, 1e4, 1e9]) {
      const { levels } = landauZenerLaw(64, a);
      expect(levels.reduce((sum, { trials }) => sum + trials, 0)).toBe(64);
      expect(levels.every(({ p }) => p === 0 || p >= 1e-290)).toBe(true);
    }
    expect(landauZenerLaw(5, 0).levels.every(({ p }) => p === 1)).toBe(true);
  });

  it('has the published cumulant ratios of slow quenches: κ2/κ1 = 1 − 1/√2, κ3/κ1 = 1 − 3/√2 + 2/√3', () => {
    // Integrals of exp(−r a k²) over k in the limit of many modes; del Campo 2018, Phys. Rev. Lett. 121:200601
    // (from memory) for the same ratios of kinks, which are twice and four times these.
    const { mean, variance, third } = lawMoments(landauZenerLaw(20_000, 400));
    expect(variance / mean).toBeCloseTo(0.292893, 5);
    expect(third / mean).toBeCloseTo(0.03338, 5);
  });
});
