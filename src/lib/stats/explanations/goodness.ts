import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import { SequentialP } from '../multiple/sequential-p';
import { generator } from '../random/generator';
import { saturated } from '../resampling/divergence';
import type { Pace } from '../resampling/pace';
import { progress } from '../resampling/progress';
import { redraw } from '../resampling/redraw';
import { scoreFit, type ScoreFit } from './score-fit';
import type { StoryModel } from './story-model';

/** Goodness of fit of a fitted law by parametric resampling. */
export interface Goodness {
  p: number;
  smallestP: number;
  resamples: number;
}

/**
 * How often histograms drawn from a fitted story lie as far from their own best fit of that story as the data do, by
 * G² = 2(Σ h ln(h/S) − ln L). Each is fitted anew, from the parameters it was drawn with, to a hundredth of a nat.
 *
 * @param modelOf the story laid over a resampled histogram
 * @param streamOf random stream of resample b
 * @param most histograms at most; ends early at 20 exceedances (Besag & Clifford 1991)
 */
export async function goodness(
  data: FitData,
  fit: ScoreFit,
  whole: Window,
  modelOf: (resample: FitData) => StoryModel,
  drawing: { most: number; seed: number; streamOf: (b: number) => number },
  pace: Pace
): Promise<Goodness> {
  const observed = saturated(data) - fit.logLikelihood;
  const source = redraw(trimmed(whole), data, data.total);
  const sequence = new SequentialP(drawing.most, Math.min(20, drawing.most));
  for (let b = 0; !sequence.done; b++) {
    const drawn = source.draw(generator(drawing.seed, drawing.streamOf(b)));
    const refit = scoreFit(modelOf(drawn), drawn, fit.x, [], 0.01);
    sequence.push(saturated(drawn) - refit.logLikelihood >= observed);
    await pace.breathe(progress(sequence));
  }
  return { p: sequence.p, smallestP: sequence.smallestP, resamples: sequence.draws };
}

/** Ends under a part 1e-18 of the largest are never drawn, and only cost time. */
function trimmed({ first, values, scale }: Window): Window {
  let largest = 0;
  for (const value of values) largest = Math.max(largest, value);
  let start = 0;
  let end = values.length;
  while (values[start] < 1e-18 * largest) start++;
  while (values[end - 1] < 1e-18 * largest) end--;
  return { first: first + start, values: values.slice(start, end), scale };
}
