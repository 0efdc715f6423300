import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Window } from '../laws/window';

/** Equal trials at p, or rare events of mean p when N is unknown: 600 decades deep. */
export function baseWindow(trials: number | null, p: number): Window {
  return trials === null ? poissonWindow(p) : binomialWindow(trials, Math.min(1, p));
}
