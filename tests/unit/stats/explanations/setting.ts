import { fitData, type FitData } from '$lib/stats/fit/fit-data';
import { sampleMoments } from '$lib/stats/fit/sample-moments';
import { fitStory } from '$lib/stats/explanations/fit-story';
import { stories } from '$lib/stats/explanations/stories';
import type { Seen, Story } from '$lib/stats/explanations/story';
import { storyModel } from '$lib/stats/explanations/story-model';
import type { StoryId } from '$lib/stats/explanations/types';
import type { Window } from '$lib/stats/laws/window';
import type { Generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';

export const storyOf = (id: StoryId): Story => stories.find((story) => story.id === id)!;

/** Probabilities of counts 0 … upTo. */
export function dense({ first, values, scale }: Window, upTo: number): number[] {
  return Array.from({ length: upTo + 1 }, (_, n) => (values[n - first] ?? 0) / scale);
}

export function momentsOf(pmf: number[]): { sum: number; mean: number; variance: number } {
  const sum = pmf.reduce((total, f) => total + f, 0);
  const mean = pmf.reduce((total, f, n) => total + n * f, 0);
  return { sum, mean, variance: pmf.reduce((total, f, n) => total + (n - mean) ** 2 * f, 0) };
}

/** Counts of the histogram from 0 on. */
export function counted(shots: number[], trials: number | null): FitData {
  const counts = shots.map((h, n) => [n, h] as [number, number]).filter(([, h]) => h > 0);
  return fitData({ kind: 'histogram', counts, lump: null }, trials);
}

/** Shots drawn from a pmf. */
export function drawn(random: Generator, pmf: number[], shots: number, trials: number | null): FitData {
  const into = new Float64Array(pmf.length);
  histogramSampler(pmf).draw(random, shots, into);
  return counted([...into], trials);
}

export function seenIn(data: FitData): Seen {
  const { mean, variance } = sampleMoments(data);
  const last = data.first + data.shots.length - 1;
  return { mean, variance, last, empty: data.first === 0 ? data.shots[0] / data.total : 0 };
}

export function modelOf(story: Story, data: FitData) {
  const seen = seenIn(data);
  return storyModel(story, data, seen, story.own(data.trials, seen));
}

/** Stories that can be told of single defects, best AIC first. */
export function ranking(data: FitData, geometry: 'sites' | 'open-bonds'): { id: StoryId; behind: number }[] {
  const last = data.first + data.shots.length - 1;
  const setting = {
    trials: data.trials,
    unit: 'defect',
    geometry,
    last,
    lump: false,
    allEven: false
  } as const;
  const fits = stories
    .filter((story) => !story.refuses(setting))
    .map((story) => {
      const fit = fitStory(modelOf(story, data), data);
      return { id: story.id, aic: fit ? 2 * fit.x.length - 2 * fit.logLikelihood : Infinity };
    })
    .sort((a, b) => a.aic - b.aic);
  return fits.map(({ id, aic }) => ({ id, behind: aic - fits[0].aic }));
}
