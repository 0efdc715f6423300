import type { Window } from '../laws/window';
import type { Climb } from './climb';
import type { FitData } from './fit-data';
import { logLikelihood } from './log-likelihood';
import { sampleMoments } from './sample-moments';
import { search, type Effort } from './search';
import { alike, starts } from './starts';
import type { TrialLevels } from './trial-levels';
import { workspace, type Workspace } from './workspace';

/** A refitted law and its pmf. */
export interface Refit {
  levels: TrialLevels;
  logLikelihood: number;
  window: Window;
}

/** Up to so many counts and trials a refit comes within 1e-3 nats of the best of many starts. */
const short = { counts: 16, trials: 40 };
const exact: Effort = { enough: 1e-5, worth: 5e-5, rounds: 60, transfers: 1 };
/**
 * Beyond, and with N unknown (a Poisson part and small trials are nearly alike), within about 0.01 nats (0.05 at
 * the worst tenth), where G² varies by six and more between resamples.
 */
const close: Effort = { enough: 1e-3, worth: 5e-3, rounds: 30, transfers: 0 };
/** With more counts than this, within about 0.4 nats, where G² varies by twelve and more; a tail hardly moves. */
const longHistogram = 64;
const rough: Effort = { enough: 5e-3, worth: 3e-2, rounds: 30, transfers: 0 };

/**
 * The best law of a resampled histogram, starting from the law it was drawn from.
 *
 * A start at a fitted law with equal levels is a symmetric saddle: Newton steps alone stay on it, up to 6
 * nats short, which biases p-values. The search asks every level whether it wants to split, so it leaves.
 *
 * @param space buffers to work in; the window that comes back is a view of them
 * @param settled a log-likelihood at which the search may end short of the best law
 */
export function refit(data: FitData, from: TrialLevels, space = workspace(data), settled = Infinity): Refit {
  const effort = effortFor(data);
  let best = search(space, from, effort, settled);
  // The law drawn from can forbid a count only by a trial at exactly 0 or 1; start afresh then.
  if (best.value === -Infinity) best = fresh(space, data, effort);
  const value = logLikelihood(space, best.levels);
  const window = { first: space.first, values: space.f.subarray(0, space.length), scale: 1 };
  return { levels: best.levels, logLikelihood: value, window };
}

function fresh(space: Workspace, data: FitData, effort: Effort): Climb {
  const moments = sampleMoments(data);
  const last = data.lump?.from ?? data.first + data.shots.length - 1;
  const from = data.withoutEmpty
    ? alike(data.trials, moments.mean)
    : starts(data.trials, moments, { first: data.below?.to ?? data.first, last })[0];
  return search(space, from, effort);
}

/** A refit that falls short makes G² of a resample too large, and so p too large: the error is on the safe side. */
function effortFor({ shots, trials }: FitData): Effort {
  if (shots.length > longHistogram) return rough;
  const few = shots.length <= short.counts && trials !== null && trials <= short.trials;
  return few ? exact : close;
}
