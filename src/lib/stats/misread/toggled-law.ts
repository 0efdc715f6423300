import { chainWindow } from './chain-window';
import { ringWindow } from './ring-window';

/**
 * Law of the number of bonds toggled by misread sites, T: what is read where no kink is. P(T = t) at index t, 0 … N,
 * for an open chain of N bonds or a ring; Σ t P(T = t) = N·2ε(1 − ε).
 */
export function toggledLaw(bonds: number, rate: number, ring = false): Float64Array {
  const { first, values, scale } = (ring ? ringWindow : chainWindow)([{ p: 0, trials: bonds }], rate);
  const out = new Float64Array(bonds + 1);
  values.forEach((value, i) => (out[first + i] = value / scale));
  return out;
}
