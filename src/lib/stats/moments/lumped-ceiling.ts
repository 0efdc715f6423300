import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Histogram } from '../types';
import { clampedVariance } from './clamped-variance';

/**
 * Variance of equal trials when the counts of each lump are one row that counts as the count nearest to the others:
 * what the ceiling becomes then.
 *
 * @param trials N, or null for a Poisson law
 * @param parameter p of the trials, or the Poisson mean
 */
export function lumpedCeiling(
  trials: number | null,
  parameter: number,
  lumps: Pick<Histogram, 'lump' | 'below'>
): number {
  const window =
    trials === null ? poissonWindow(parameter, 1e-20, 1) : binomialWindow(trials, parameter, 1e-20, 1);
  return clampedVariance(window, lumps);
}
