import { describe, expect, it } from 'vitest';
import { fitStory } from '$lib/stats/explanations/fit-story';
import { goodness } from '$lib/stats/explanations/goodness';
import { generator } from '$lib/stats/random/generator';
import { unbroken } from '$lib/stats/resampling/pace';
import type { FitData } from '$lib/stats/fit/fit-data';
import type { StoryId } from '$lib/stats/explanations/types';
import { dense, drawn, modelOf, storyOf } from './setting';

async function fitsBy(id: StoryId, data: FitData) {
  const story = storyOf(id);
  const model = modelOf(story, data);
  const fit = fitStory(model, data)!;
  const drawing = { most: 199, seed: 4, streamOf: (b: number) => 7_000_000 + b };
  return goodness(data, fit, model.whole(fit.x), (counts) => modelOf(story, counts), drawing, unbroken);
}

describe('goodness', () => {
  it('cries wolf about as often as its level says, when the story is true', async () => {
    const law = dense(storyOf('common-cause').window(0.2, [0.05], 16, 16), 16);
    let low = 0;
    for (let r = 0; r < 60; r++) {
      const { p } = await fitsBy('common-cause', drawn(generator(3, r), law, 1000, 16));
      if (p <= 0.2) low++;
    }
    // Bin(60, 0.2): 12 ± 3.1; beyond 3 and 23 once in some thousand.
    expect(low).toBeGreaterThanOrEqual(3);
    expect(low).toBeLessThanOrEqual(23);
  });

  it('refuses a story that is not the cause, at the smallest p it can show', async () => {
    const law = dense(storyOf('dead-shots').window(0.3, [0.1], 16, 16), 16);
    const found = await fitsBy('neighbours', drawn(generator(3, 1), law, 5000, 16));
    expect(found).toEqual({ p: 1 / 200, smallestP: 1 / 200, resamples: 199 });
  });
});
