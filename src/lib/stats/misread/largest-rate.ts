import type { Geometry } from '../types';
import { chainMoments } from './chain-moments';

/** Standard errors by which the mean must miss: one in three million for a normal mean. */
const reach = 5;

/**
 * Largest misread rate ε that a mean count allows, whatever the independent trials.
 *
 * Trials only add to what misreads alone show or, mirrored, to what they hide: a bond is read as a kink with a probability
 * between 2ε(1 − ε) and its complement, a site as a defect with one between ε and 1 − ε. So min(mean, N − mean) is at
 * least N·2ε(1 − ε), or N·ε on sites, and a mean five standard errors of the misreads alone below that refutes ε.
 *
 * @param mean mean count of single defects
 * @returns ε in 0 … ½; ½ where the mean allows every rate
 */
export function largestRate(mean: number, trials: number, shots: number, geometry: Geometry): number {
  const room = Math.min(mean, trials - mean);
  const refuted = (rate: number) => {
    const alone = misreadsAlone(rate, trials, geometry);
    return room < alone.mean - reach * Math.sqrt(alone.variance / shots);
  };
  if (!refuted(0.5)) return 0.5;
  let low = 0;
  let high = 0.5;
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (refuted(middle)) high = middle;
    else low = middle;
  }
  return low;
}

/** Mean and variance of what misreads show where there is no defect at all. */
export function misreadsAlone(
  rate: number,
  trials: number,
  geometry: Geometry
): { mean: number; variance: number } {
  if (geometry === 'sites') return { mean: trials * rate, variance: trials * rate * (1 - rate) };
  const { mean, variance } = chainMoments([{ p: 0, trials }], rate);
  if (geometry === 'open-bonds') return { mean, variance };
  // A ring has one more pair of bonds with a site in common, of covariance ¼u(1 − u), u = (1 − 2ε)².
  const u = (1 - 2 * rate) ** 2;
  return { mean, variance: variance + (u * (1 - u)) / 2 };
}
