import { outwardWindow } from './outward-window';
import { deepScale, type Window } from './window';

/**
 * Poisson pmf of mean `mean` ≥ 0 as a window around its mode; `trim` and `scale` as for binomialWindow.
 * f_{n+1}/f_n = mean/(n+1).
 */
export function poissonWindow(mean: number, trim = 0, scale = deepScale): Window {
  if (mean <= 0) return { first: 0, values: Float64Array.of(scale), scale };
  return outwardWindow(
    Math.floor(mean),
    (n) => n / mean,
    (n) => mean / (n + 1),
    trim,
    scale
  );
}
