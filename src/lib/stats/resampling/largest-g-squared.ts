import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import { cells } from './cells';
import { saturated } from './divergence';
import { gSquaredLeft } from './g-squared-left';

/**
 * G² of a resample from the law it was drawn from, 2Σ h ln(h/(S f)): no refit of it can leave more, since the
 * search for one starts at that law. Enlarged by what sums over S shots may be rounded.
 *
 * @param window the law drawn from, trimmed where nothing is drawn
 */
export function largestGSquared(resample: FitData, window: Window): number {
  const { law, below, above } = cells(resample, window);
  let logLikelihood = resample.lump ? resample.lump.shots * Math.log(above) : 0;
  if (resample.below) logLikelihood += resample.below.shots * Math.log(below);
  for (let i = 0; i < law.length; i++) {
    if (resample.shots[i] > 0) logLikelihood += resample.shots[i] * Math.log(law[i]);
  }
  return gSquaredLeft(saturated(resample), logLikelihood, resample.total);
}
