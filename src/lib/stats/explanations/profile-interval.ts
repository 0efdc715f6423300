import type { FitData } from '../fit/fit-data';
import { findRoot } from '../numerics/find-root';
import { scoreFit, type ScoreFit } from './score-fit';
import type { StoryModel } from './story-model';

/** Half of the 95 % quantile of χ² with one degree of freedom, 3.841459. */
const drop = 1.9207294103470573;

/** Index of the story's own number among those searched. */
const own = 1;

/**
 * Profile-likelihood interval of a story's own parameter at 95 %: the values at which the likelihood, maximised over the
 * other parameters, lies at most 1.92 nats under its maximum.
 *
 * @returns its ends, and `atBound` where an end is the end of the parameter's range and not yet 1.92 nats down: at the
 *   lower end the story then cannot be told from equal trials. There the interval covers more than 95 %.
 * Source: Wilks 1938; Venzon & Moolgavkar 1988, Applied Statistics 37:87 (m).
 */
export function profileInterval(
  model: StoryModel,
  data: FitData,
  fit: ScoreFit
): { low: number; high: number; atBound: 'low' | 'high' | 'both' | null } {
  const best = fit.x[own];
  let warm = fit.x;
  const depth = (value: number): number => {
    const at = (from: number[]) => {
      const start = from.slice();
      start[own] = value;
      return scoreFit(model, data, start, [own], 1e-4);
    };
    let found = at(warm);
    if (found.logLikelihood === -Infinity) found = at(fit.x);
    if (found.logLikelihood > -Infinity) warm = found.x;
    // Without a number the search for a sign would end: as good as infinitely deep.
    return found.logLikelihood > -Infinity ? fit.logLikelihood - found.logLikelihood - drop : 1e9;
  };
  const range = model.high[own] - model.low[own];
  const unit = Math.min(range / 8, Math.max(1e-6 * range, fit.errors[own]));
  const end = (sign: 1 | -1): { at: number; bound: boolean } => {
    const bound = sign > 0 ? model.high[own] : model.low[own];
    warm = fit.x;
    let inside = best;
    for (let reach = 2 * unit; ; reach *= 1.7) {
      const outside = sign > 0 ? Math.min(bound, best + reach) : Math.max(bound, best - reach);
      if (!(outside !== inside)) return { at: bound, bound: true };
      const deep = depth(outside);
      if (deep > 0) {
        const root = findRoot(
          (value) => (value === best ? -drop : depth(value)),
          inside,
          outside,
          1e-4 * unit
        );
        // A search that found another hill in between leaves no change of sign: the wider end is the safe one.
        return { at: Number.isNaN(root) ? outside : root, bound: false };
      }
      if (outside === bound) return { at: bound, bound: true };
      inside = outside;
    }
  };
  const [low, high] = [end(-1), end(1)];
  const atBound = low.bound ? (high.bound ? 'both' : 'low') : high.bound ? 'high' : null;
  return { low: low.at, high: high.at, atBound };
}
