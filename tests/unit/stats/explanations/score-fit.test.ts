import { describe, expect, it } from 'vitest';
import reference from '../../../../fixtures/reference/explanations.json';
import { fitStory } from '$lib/stats/explanations/fit-story';
import { profileInterval } from '$lib/stats/explanations/profile-interval';
import { scoreFit } from '$lib/stats/explanations/score-fit';
import { stories } from '$lib/stats/explanations/stories';
import { windowLogLikelihood } from '$lib/stats/explanations/window-log-likelihood';
import { generator } from '$lib/stats/random/generator';
import { counted, dense, drawn, modelOf, storyOf } from './setting';

// Greenwood & Yule 1920, accidents in 647 women; and an invented table with N = 12.
const accidents = counted([447, 132, 42, 21, 3, 2], null);
const invented = counted([60, 130, 190, 220, 170, 120, 60, 30, 14, 5, 1], 12);

describe('fits and profile intervals', () => {
  // Values from fixtures/reference/explanations.py: SciPy's pmfs, Nelder–Mead and Brent's root.
  it.each([
    ['common-cause', accidents, reference.negativeBinomial],
    ['common-cause', invented, reference.betaBinomial],
    ['dead-shots', accidents, { ...reference.zeroInflatedPoisson, interval: null }]
  ] as const)('%s agrees with SciPy', (id, data, expected) => {
    const model = modelOf(storyOf(id), data);
    const fit = fitStory(model, data)!;
    expect(fit.logLikelihood).toBeCloseTo(expected.logLikelihood, 6);
    expect(Math.abs(model.base(fit.x) / expected.base - 1)).toBeLessThan(1e-4);
    expect(Math.abs(fit.x[1] / expected.own - 1)).toBeLessThan(1e-4);
    if (!expected.interval) return;
    const { low, high, atBound } = profileInterval(model, data, fit);
    expect(Math.abs(low / expected.interval[0] - 1)).toBeLessThan(1e-4);
    expect(Math.abs(high / expected.interval[1] - 1)).toBeLessThan(1e-4);
    expect(atBound).toBeNull();
  });

  it('no point of a fine grid is better than the fit, for any story', () => {
    for (const story of stories) {
      const data = drawn(
        generator(31, 1),
        dense(storyOf('common-cause').window(0.2, [0.04], 16, 16), 16),
        3000,
        16
      );
      const model = modelOf(story, data);
      const fit = fitStory(model, data)!;
      const [lows, highs] = [model.low, model.high];
      for (let i = 0; i <= 60; i++) {
        for (let j = 0; j <= 60; j++) {
          const x = fit.x.slice();
          x[0] = -4 + i / 10;
          x[1] = lows[1] + ((highs[1] - lows[1]) * j) / 60;
          expect(windowLogLikelihood(data, model.window(x))).toBeLessThanOrEqual(fit.logLikelihood + 1e-5);
        }
      }
    }
  });

  it('a parameter held stays where it is', () => {
    const model = modelOf(storyOf('neighbours'), invented);
    expect(scoreFit(model, invented, [-1, 0.123], [1]).x[1]).toBe(0.123);
  });

  it('says when the interval ends at the end of the range', () => {
    const data = drawn(generator(5, 1), dense(storyOf('dead-shots').window(0.3, [0], 20, 20), 20), 400, 20);
    const model = modelOf(storyOf('dead-shots'), data);
    const found = profileInterval(model, data, fitStory(model, data)!);
    expect(found).toMatchObject({ low: 0, atBound: 'low' });
    expect(found.high).toBeGreaterThan(0);
    expect(found.high).toBeLessThan(0.02);
  });

  it('covers the truth as often as it says', () => {
    // 200 repeats: 95 % is 190 ± 3.1; 177 would be four standard deviations off.
    let covered = 0;
    const law = dense(storyOf('common-cause').window(0.2, [0.02], 24, 24), 24);
    for (let r = 0; r < 200; r++) {
      const data = drawn(generator(77, r), law, 1500, 24);
      const model = modelOf(storyOf('common-cause'), data);
      const { low, high } = profileInterval(model, data, fitStory(model, data)!);
      if (low <= 0.02 && high >= 0.02) covered++;
    }
    expect(covered).toBeGreaterThanOrEqual(178);
    expect(covered).toBeLessThanOrEqual(200);
  });
});
