import { misreadNeeded } from '../flags/misread-needed';
import type { Interval } from '../types';
import { ringNeeded } from './ring-needed';

/**
 * Misread rate ε of a site with which equal independent kinks on an open chain or a ring would have the mean and variance seen, to
 * be compared with calibration: 0 where the variance does not pass the ceiling anyway, null where no rate would do.
 * `low` and `high` come from the limits of the variance: a rate below `low` is too small to explain the excess.
 *
 * @param variance unbiased variance with its 95 % limits
 * @param bonds N ≥ 2, on a ring 3
 */
export function neededRate(mean: number, variance: Interval, bonds: number, ring = false): Interval {
  const at = (value: number | null) => {
    if (value === null || !(mean > 0 && mean < bonds)) return null;
    if (ring) return ringNeeded(mean, value, bonds);
    return value <= mean * (1 - mean / bonds) ? 0 : misreadNeeded(mean, value, bonds);
  };
  return { value: at(variance.value), low: at(variance.low), high: at(variance.high) };
}
