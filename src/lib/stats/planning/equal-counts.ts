import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Window } from '../laws/window';

/** Counts of equal trials of a mean, Poisson with N unknown: the null that plans are made against. */
export const equalCounts = (mean: number, trials: number | null): Window =>
  trials === null ? poissonWindow(mean, 1e-18, 1) : binomialWindow(trials, mean / trials, 1e-18, 1);
