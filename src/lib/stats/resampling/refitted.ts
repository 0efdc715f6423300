import type { FitData } from '../fit/fit-data';
import { divergence } from './divergence';
import {
  asLaw,
  familyRefit,
  type Buffers,
  type FamilyRefit,
  type FittedLaw,
  type FittedLevels
} from './fitted-law';
import { setEmptyAside } from './set-empty-aside';

export type { Buffers };

/** A histogram with its own best law, and, when asked for, the best law of its shots with n ≥ 1. */
export interface Refitted {
  data: FitData;
  fit: FamilyRefit;
  law: FittedLaw;
  /** KL of the histogram from its law, nats a shot. */
  divergence: number;
  /** Without empty shots; null when there are none, or nothing else. Fitted once, at first use. */
  rest(): { data: FitData; fit: FamilyRefit } | null;
}

/**
 * Fits a histogram from the levels of another's law; see refit, also for `settled`, which concerns the whole
 * histogram alone. With `buffers` it holds until their next use.
 */
export function refitted(
  data: FitData,
  from: FittedLevels,
  known?: FamilyRefit,
  buffers: Buffers = {},
  settled = Infinity
): Refitted {
  const fit = known ?? familyRefit(data, from, buffers, 'whole', settled);
  let rest: { data: FitData; fit: FamilyRefit } | null | undefined;
  return {
    data,
    fit,
    law: asLaw(fit.levels),
    divergence: divergence(data, fit.logLikelihood),
    rest() {
      if (rest === undefined) {
        const aside = setEmptyAside(data);
        // Starting where the whole histogram's law is, the rest can only be fitted better, never worse.
        rest =
          aside.empty > 0 && aside.rest.total > 0
            ? {
                data: aside.rest,
                fit: familyRefit(aside.rest, fit.levels, buffers, 'rest')
              }
            : null;
      }
      return rest;
    }
  };
}
