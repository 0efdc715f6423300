import type { ScoreFit } from './score-fit';
import type { StoryModel } from './story-model';

/** 97.5 % quantile of the normal law. */
const reach = 1.959963984540054;

/**
 * Interval of a story's own parameter from its standard error, cut to its range: for stories that are out of the
 * question, where a profile would cost most of the time.
 */
export function curvatureInterval(
  model: StoryModel,
  fit: ScoreFit
): { low: number; high: number; atBound: 'low' | 'high' | 'both' | null } {
  const width = reach * fit.errors[1];
  const low = Math.max(model.low[1], fit.x[1] - width);
  const high = Math.min(model.high[1], fit.x[1] + width);
  const [down, up] = [low === model.low[1], high === model.high[1]];
  return { low, high, atBound: down ? (up ? 'both' : 'low') : up ? 'high' : null };
}
