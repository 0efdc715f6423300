import { outwardWindow } from './outward-window';
import { deepScale, type Window } from './window';

/**
 * Binomial pmf of `trials` trials at `p` as a window around its mode.
 *
 * @param trials number of trials m ≥ 0, an integer
 * @param p probability, 0 ≤ p ≤ 1
 * @param trim part of the mode's probability below which values are left out; 0 keeps 600 decades. A
 *   window trimmed at 1e-20 misses about 1e-18 of the total probability.
 * @param scale what the values are multiplied by; they sum to it
 *
 * f_{n+1}/f_n = (m−n)p / ((n+1)(1−p)).
 */
export function binomialWindow(trials: number, p: number, trim = 0, scale = deepScale): Window {
  if (p <= 0 || trials === 0) return { first: 0, values: Float64Array.of(scale), scale };
  if (p >= 1) return { first: trials, values: Float64Array.of(scale), scale };
  const odds = p / (1 - p);
  const mode = Math.min(trials, Math.floor((trials + 1) * p));
  const down = (n: number) => n / ((trials - n + 1) * odds);
  const up = (n: number) => ((trials - n) * odds) / (n + 1);
  return outwardWindow(mode, down, up, trim, scale);
}
