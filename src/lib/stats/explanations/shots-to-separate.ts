import type { FitData } from '../fit/fit-data';
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

/**
 * S·KL at which the true story leads its rival by AIC 2 in four of five repeats. The log-likelihood ratio of close laws
 * is about normal with mean S·KL and variance 2S·KL, so S·KL − 0.842·√(2S·KL) = 1.
 */
const needed = 3.09;

/**
 * Shots at which the counts alone would tell two stories apart, if the first is true as fitted: 3.09/KL(first ‖ second),
 * the second fitted anew to the very law of the first.
 *
 * @returns null when the second can copy the first so closely that a billion shots would not do, or gives its counts no probability
 */
export function shotsToSeparate(data: FitData, first: FittedStory, second: FittedStory): number | null {
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
  const rival = scoreFit(second.over(expected), expected, second.fit.x);
  if (rival.logLikelihood === -Infinity) return null;
  const distance = (saturated(expected) - rival.logLikelihood) / expected.total;
  return distance > needed / 1e9 ? Math.ceil(needed / distance) : null;
}
