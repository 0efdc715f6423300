import type { FitData } from '../fit/fit-data';
import { refit, type Refit } from '../fit/refit';
import { toLaw, type TrialLevels } from '../fit/trial-levels';
import { workspace, type Workspace } from '../fit/workspace';
import type { Law } from '../types';
import { divergence } from './divergence';
import { setEmptyAside } from './set-empty-aside';

/** A histogram with its own best law, and, when asked for, the best law of its shots with n ≥ 1. */
export interface Refitted {
  data: FitData;
  fit: Refit;
  law: Law;
  /** KL of the histogram from its law, nats a shot. */
  divergence: number;
  /** Without empty shots; null when there are none, or nothing else. Fitted once, at first use. */
  rest(): { data: FitData; fit: Refit } | null;
}

/** Buffers that the refits of one resample leave to those of the next, whose pmf then overwrites theirs. */
export interface Buffers {
  whole?: Workspace;
  rest?: Workspace;
}

/**
 * Fits a histogram from the levels of another's law; see refit, also for `settled`, which concerns the whole
 * histogram alone. With `buffers` it holds until their next use.
 */
export function refitted(
  data: FitData,
  from: TrialLevels,
  known?: Refit,
  buffers: Buffers = {},
  settled = Infinity
): Refitted {
  const fit = known ?? refit(data, from, (buffers.whole = workspace(data, buffers.whole)), settled);
  let rest: { data: FitData; fit: Refit } | null | undefined;
  return {
    data,
    fit,
    law: toLaw(fit.levels),
    divergence: divergence(data, fit.logLikelihood),
    rest() {
      if (rest === undefined) {
        const aside = setEmptyAside(data);
        // Starting where the whole histogram's law is, the rest can only be fitted better, never worse.
        rest =
          aside.empty > 0 && aside.rest.total > 0
            ? {
                data: aside.rest,
                fit: refit(aside.rest, fit.levels, (buffers.rest = workspace(aside.rest, buffers.rest)))
              }
            : null;
      }
      return rest;
    }
  };
}
