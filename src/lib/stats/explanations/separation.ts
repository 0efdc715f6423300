import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import { saturated } from '../resampling/divergence';
import { scoreFit, type ScoreFit } from './score-fit';
import type { StoryModel } from './story-model';

/** A story laid over the data, and where it fits best. */
export interface FittedStory {
  model: StoryModel;
  fit: ScoreFit;
  /** The story laid over other counts. */
  over(data: FitData): StoryModel;
}

/** What one shot says for a true story f against its rival g. */
export interface Separation {
  /** Mean of ln(f/g), nats: KL. */
  distance: number;
  /** Its variance under f. */
  variance: number;
  /** Free numbers that the true story has more; may be negative. */
  more: number;
}

/**
 * How far the first of two stories lies from the second, if it is true as fitted and the second is fitted anew to its
 * very law.
 *
 * @returns null when the second gives some of its counts no probability
 */
export function separation(data: FitData, first: FittedStory, second: FittedStory): Separation | null {
  const { first: start, values, scale } = first.model.whole(first.fit.x);
  // Counts that turn up less than once in 1e12 shots settle nothing, and a rival may not reach them at all.
  const kept = Array.from(values, (value) => (value > 1e-12 * scale ? (value / scale) * data.total : 0));
  const from = kept.findIndex((value) => value > 0);
  let to = kept.length;
  while (to > from && kept[to - 1] === 0) to--;
  const expected: FitData = {
    trials: data.trials,
    first: start + from,
    shots: Float64Array.from(kept.slice(from, to)),
    lump: null,
    below: null,
    total: kept.reduce((sum, value) => sum + value, 0),
    withoutEmpty: false
  };
  const over = second.over(expected);
  const rival = scoreFit(over, expected, second.fit.x);
  if (rival.logLikelihood === -Infinity) return null;
  const distance = (saturated(expected) - rival.logLikelihood) / expected.total;
  const ratios = logRatios(expected, over.window(rival.x));
  const variance = ratios.reduce((sum, { f, ratio }) => sum + f * (ratio - distance) ** 2, 0);
  return { distance, variance, more: first.fit.x.length - second.fit.x.length };
}

/** ln(f/g) of every count that the truth f has, with its probability. */
function logRatios({ first, shots, total }: FitData, rival: Window): { f: number; ratio: number }[] {
  return Array.from(shots, (shot, i) => ({
    f: shot / total,
    g: rival.values[first + i - rival.first] / rival.scale
  }))
    .filter(({ f }) => f > 0)
    .map(({ f, g }) => ({ f, ratio: Math.log(f / g) }));
}
