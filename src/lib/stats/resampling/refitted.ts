import type { FitData } from '../fit/fit-data';
import { refit, type Refit } from '../fit/refit';
import { toLaw, type TrialLevels } from '../fit/trial-levels';
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

/** Fits a histogram from the levels of another's law; see refit. */
export function refitted(data: FitData, from: TrialLevels, known?: Refit): Refitted {
  const fit = known ?? refit(data, from);
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
            ? { data: aside.rest, fit: refit(aside.rest, fit.levels) }
            : null;
      }
      return rest;
    }
  };
}
