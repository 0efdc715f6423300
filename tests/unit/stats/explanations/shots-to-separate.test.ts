import { describe, expect, it } from 'vitest';
import { fitStory } from '$lib/stats/explanations/fit-story';
import { shotsToSeparate, type FittedStory } from '$lib/stats/explanations/shots-to-separate';
import type { StoryId } from '$lib/stats/explanations/types';
import type { FitData } from '$lib/stats/fit/fit-data';
import { generator } from '$lib/stats/random/generator';
import { counted, dense, drawn, modelOf, ranking, storyOf } from './setting';

function fitted(id: StoryId, data: FitData): FittedStory {
  const story = storyOf(id);
  const model = modelOf(story, data);
  return { model, fit: fitStory(model, data)!, over: (counts) => modelOf(story, counts) };
}

describe('shotsToSeparate', () => {
  it.each([
    ['two-settings', 'common-cause', 0.2, [0.35], 24],
    // Rare counts carry the difference: with 2·KL for the variance it was 226 shots, and 31 % of 200 repeats.
    ['bursts', 'common-cause', 0.1, [0.002, 0.3], 64],
    ['bursts', 'dead-shots', 0.1, [0.002, 0.3], 64]
  ] as [StoryId, StoryId, number, number[], number][])(
    'says how many shots make %s lead %s by AIC 2 in about four of five repeats',
    (truth, rival, p, own, trials) => {
      const law = dense(storyOf(truth).window(p, own, trials, trials), trials);
      // As many shots of exactly that law as a double holds well.
      const ideal = counted(
        law.map((f) => Math.round(f * 1e12)),
        trials
      );
      const shots = shotsToSeparate(ideal, fitted(truth, ideal), fitted(rival, ideal))!;
      let apart = 0;
      for (let r = 0; r < 100; r++) {
        const ranks = ranking(drawn(generator(21, r), law, shots, trials), 'sites');
        const place = (id: StoryId) => ranks.find((one) => one.id === id)!.behind;
        if (place(rival) - place(truth) > 2) apart++;
      }
      // The ratio is taken to be normal: 80 ± 4 (binomial), and 12 for what that leaves out.
      expect(apart).toBeGreaterThan(64);
      expect(apart).toBeLessThan(96);
    }
  );

  it('is null where the rival can copy the law', () => {
    const data = counted([500, 300, 150, 40, 10], 2e5);
    expect(shotsToSeparate(data, fitted('common-cause', data), fitted('common-cause', data))).toBeNull();
  });
});
