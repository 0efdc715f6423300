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

/** 80 % quantile of the normal law. */
const fourInFive = 0.8416212335729143;

/**
 * S·KL at which the true story leads its rival by AIC 2 in four of five repeats. The log-likelihood ratio of close laws
 * is about normal with variance 2S·KL and mean S·KL + d/2, d the free numbers that the truth has more: each gains half a
 * nat by being fitted, and AIC takes a whole one. So S·KL − 0.842·√(2S·KL) = 1 + d/2; 3.09 for d = 0.
 *
 * @param more d, which may be negative; from −2 on the penalty alone separates them where the rival copies the truth
 */
function needed(more: number): number {
  const half = fourInFive / Math.SQRT2;
  const lead = Math.max(0, 1 + more / 2);
  return (half + Math.sqrt(half * half + lead)) ** 2;
}

/**
 * Shots at which the counts alone would tell two stories apart, if the first is true as fitted: a bar over KL(first ‖
 * second), the second fitted anew to the very law of the first; the bar allows for free numbers that one has more.
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
  const bar = needed(first.fit.x.length - second.fit.x.length);
  return distance > bar / 1e9 ? Math.ceil(bar / distance) : null;
}
