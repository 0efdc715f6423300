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

/** 80 % quantile of the normal law. */
const fourInFive = 0.8416212335729143;

/**
 * Shots S at which the true story leads its rival by AIC 2 in four of five repeats. The log-likelihood ratio is about
 * normal with mean S·KL + d/2 and variance S·V, V that of ln(f/g) in one shot under the truth f and d the free numbers
 * that it has more: each gains half a nat by being fitted, and AIC takes a whole one. So S·KL − 0.842·√(S·V) = 1 + d/2.
 * For close laws V = 2·KL, and S·KL = 3.09 for d = 0; where a few rare counts carry all the difference V is far more, and
 * 2·KL let half a burst on average pass for enough.
 *
 * @param more d, which may be negative; from −2 on the penalty alone separates them where the rival copies the truth
 */
function needed(distance: number, variance: number, more: number): number {
  const spread = fourInFive * Math.sqrt(variance);
  const lead = Math.max(0, 1 + more / 2);
  return ((spread + Math.sqrt(spread * spread + 4 * distance * lead)) / (2 * distance)) ** 2;
}

/**
 * Shots at which the counts alone would tell two stories apart, if the first is true as fitted: see `needed`, the
 * second fitted anew to the very law of the first.
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
  const over = second.over(expected);
  const rival = scoreFit(over, expected, second.fit.x);
  if (rival.logLikelihood === -Infinity) return null;
  const distance = (saturated(expected) - rival.logLikelihood) / expected.total;
  if (!(distance > 0)) return null;
  const ratios = logRatios(expected, over.window(rival.x));
  const variance = ratios.reduce((sum, { f, ratio }) => sum + f * (ratio - distance) ** 2, 0);
  const shots = needed(distance, variance, first.fit.x.length - second.fit.x.length);
  return shots <= 1e9 ? Math.ceil(shots) : null;
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
