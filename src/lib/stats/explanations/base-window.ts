import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Window } from '../laws/window';

/** Equal trials at p, or rare events of mean p when N is unknown: 600 decades deep, or down to a part `trim` of the mode. */
export function baseWindow(trials: number | null, p: number, trim = 0): Window {
  return trials === null ? poissonWindow(p, trim) : binomialWindow(trials, Math.min(1, p), trim);
}
