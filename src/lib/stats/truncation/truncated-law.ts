import { deepScale, type Window } from '../laws/window';
import { lawWindow } from '../laws/law-window';
import type { Law } from '../types';

/** Counts that were kept; `to` is Infinity when nothing was cut above. */
export interface KeptCounts {
  from: number;
  to: number;
}

/**
 * Law of the counts that are left when only those from `from` to `to` are kept: f_n/P(from ≤ X ≤ to). Relative error
 * as of the law itself.
 *
 * @returns null when no count that the law allows was kept
 */
export function truncatedLaw(law: Law, { from, to }: KeptCounts, scale = deepScale): Window | null {
  const whole = lawWindow(law, 0, deepScale);
  const start = Math.max(0, from - whole.first);
  const end = Math.min(whole.values.length - 1, to - whole.first);
  if (end < start) return null;
  const values = whole.values.slice(start, end + 1);
  // Smallest terms first: both ends fall off from the mode.
  const total = Float64Array.from(values)
    .sort()
    .reduce((sum, f) => sum + f, 0);
  if (!(total > 0)) return null;
  for (let i = 0; i < values.length; i++) values[i] = (values[i] / total) * scale;
  return { first: whole.first + start, values, scale };
}
