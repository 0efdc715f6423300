import type { Window } from '../laws/window';
import type { KeptCounts } from './truncated-law';

/**
 * A law's window with only the counts kept, summing to one again: f_n/P(kept). Relative error as of the window.
 *
 * @returns a single 0 where nothing of the law was kept
 */
export function truncatedWindow(whole: Window, { from, to }: KeptCounts, scale = whole.scale): Window {
  const start = Math.max(0, from - whole.first);
  const end = Math.min(whole.values.length - 1, to - whole.first);
  const values = end < start ? new Float64Array(1) : whole.values.slice(start, end + 1);
  // Smallest terms first: both ends fall off from the mode.
  const total = Float64Array.from(values)
    .sort()
    .reduce((sum, f) => sum + f, 0);
  if (total > 0) for (let i = 0; i < values.length; i++) values[i] = (values[i] / total) * scale;
  return { first: end < start ? from : whole.first + start, values, scale };
}
