import type { Window } from '../laws/window';

/**
 * Law of a shot that is of one kind with probability `share` and of another otherwise: share·f + (1 − share)·g. Both
 * windows must have the same scale.
 */
export function mixture(share: number, f: Window, g: Window): Window {
  const first = Math.min(f.first, g.first);
  const end = Math.max(f.first + f.values.length, g.first + g.values.length);
  const values = new Float64Array(end - first);
  for (let k = 0; k < f.values.length; k++) values[f.first - first + k] += share * f.values[k];
  for (let k = 0; k < g.values.length; k++) values[g.first - first + k] += (1 - share) * g.values[k];
  return { first, values, scale: f.scale };
}
