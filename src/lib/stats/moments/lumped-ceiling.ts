import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';

/**
 * Variance of min(X, from) for equal trials: what the ceiling becomes when counts of `from` and more are one row that
 * counts as `from`.
 *
 * @param trials N, or null for a Poisson law
 * @param parameter p of the trials, or the Poisson mean
 */
export function lumpedCeiling(trials: number | null, parameter: number, from: number): number {
  const window =
    trials === null ? poissonWindow(parameter, 1e-20, 1) : binomialWindow(trials, parameter, 1e-20, 1);
  const count = (i: number) => Math.min(from, window.first + i);
  const mean = window.values.reduce((sum, f, i) => sum + f * count(i), 0);
  return window.values.reduce((sum, f, i) => sum + f * (count(i) - mean) ** 2, 0);
}
