import { momentValues } from '../moments/moment-values';
import type { VersionCounts } from './dispersion-rise';

/** Logarithm of variance over ceiling, with its standard error; NaN where the counts do not vary. */
export interface LogDispersion {
  log: number;
  error: number;
  mean: number;
  meanError: number;
}

/**
 * ln D of the unbiased variance over the ceiling, with error e/D by the influence function (momentValues), taken as no
 * less than that of equal trials, √(2(1 − 1/N)/S): few shots at a low mean often show none of the rare counts that make
 * the error, and a reference of 200 shots at a mean of 0.3 would raise 11 % of false alarms at 5 %. The mean and its
 * error come along.
 */
export function logDispersion({ counts, trials }: VersionCounts): LogDispersion {
  const n = Float64Array.from(counts, ([count]) => count);
  const shots = Float64Array.from(counts, ([, seen]) => seen);
  const values = new Float64Array(12);
  const total = shots.reduce((sum, h) => sum + h, 0);
  momentValues(n, shots, total, trials, values);
  const even = Math.sqrt((2 * (1 - (trials === null ? 0 : 1 / trials))) / total);
  return {
    log: Math.log(values[5]),
    error: Math.max(even, values[11] / values[5]),
    mean: values[0],
    meanError: values[6]
  };
}
