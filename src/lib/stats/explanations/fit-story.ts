import type { FitData } from '../fit/fit-data';
import { scoreFit, type ScoreFit } from './score-fit';
import type { StoryModel } from './story-model';

/** The best of the searches from all starts of a story; null when the story gives some count seen no probability. */
export function fitStory(model: StoryModel, data: FitData): ScoreFit | null {
  let best: ScoreFit | null = null;
  for (const start of model.starts) {
    const found = scoreFit(model, data, start, [], 1e-3);
    if (found.logLikelihood > (best?.logLikelihood ?? -Infinity)) best = found;
  }
  // Only the best is taken to the end: on a flat ridge that is most of the work.
  return best && scoreFit(model, data, best.x);
}
