import type { MeanAndVariance } from '../shift-for-excess';

/** Mean and variance of `trials` equal trials, and their ceiling. */
export const equalAt = (
  trials: number
): { at: (p: number) => MeanAndVariance; ceiling: (mean: number) => number } => ({
  at: (p) => ({ mean: trials * p, variance: trials * p * (1 - p) }),
  ceiling: (mean) => mean * (1 - mean / trials)
});
