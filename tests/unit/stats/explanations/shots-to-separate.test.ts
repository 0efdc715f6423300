import { describe, expect, it } from 'vitest';
import { fitStory } from '$lib/stats/explanations/fit-story';
import { separation, type FittedStory } from '$lib/stats/explanations/separation';
import { shotsToSeparate } from '$lib/stats/explanations/shots-to-separate';
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
      const shots = shotsToSeparate([separation(ideal, fitted(truth, ideal), fitted(rival, ideal))!])!;
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
    const same = separation(data, fitted('common-cause', data), fitted('common-cause', data))!;
    expect(shotsToSeparate([same])).toBeNull();
    expect(shotsToSeparate([])).toBeNull();
  });

  it('agrees with the root of its own equation for one rival', () => {
    // S·KL − 0.8416·√(S·V) = 1 + d/2, solved for √S; 0.8416212 is the normal law's 80 % quantile.
    for (const [distance, variance, more] of [
      [0.01, 0.02, 0],
      [0.002, 0.09, 1],
      [0.3, 0.4, -1]
    ]) {
      const [b, c] = [0.8416212335729143 * Math.sqrt(variance), 1 + more / 2];
      const root = (b + Math.sqrt(b * b + 4 * distance * c)) / (2 * distance);
      const shots = shotsToSeparate([{ distance, variance, more }])!;
      expect(Math.abs(shots - root * root)).toBeLessThan(1.5);
    }
  });

  it.each([
    ['two-settings', 0.2, [0.35], 24],
    ['pair-loss', 0.3, [0.2], 40],
    // Led all of its rivals in 65 of 100 at the shots of the hardest one alone.
    ['bursts', 0.1, [0.01, 0.3], 64]
  ] as [StoryId, number, number[], number][])(
    'says how many shots make %s lead every other story in four of five repeats or more',
    (truth, p, own, trials) => {
      const law = dense(storyOf(truth).window(p, own, trials, trials), trials);
      const ideal = counted(
        law.map((f) => Math.round(f * 1e12)),
        trials
      );
      const others = ranking(ideal, 'sites').filter(({ id }) => id !== truth);
      const apart = others.map(({ id }) => separation(ideal, fitted(truth, ideal), fitted(id, ideal)));
      const known = apart.filter((one) => one !== null);
      const each = Math.max(...known.map((one) => shotsToSeparate([one])!));
      const shots = shotsToSeparate(known)!;
      expect(shots).toBeGreaterThanOrEqual(each);
      let leads = 0;
      for (let r = 0; r < 100; r++) {
        const [first, second] = ranking(drawn(generator(22, r), law, shots, trials), 'sites');
        if (first.id === truth && second.behind > 2) leads++;
      }
      // A bound: 80 or more, less four binomial errors' worth of chance at 100 repeats.
      expect(leads).toBeGreaterThan(66);
    }
  );
});
