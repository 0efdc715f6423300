import { deepScale, type Window } from '../laws/window';
import { lawWindow } from '../laws/law-window';
import type { Law } from '../types';
import { truncatedWindow } from './truncated-window';

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
  if (to < whole.first || from >= whole.first + whole.values.length) return null;
  const window = truncatedWindow(whole, { from, to }, scale);
  return window.values.some((f) => f > 0) ? window : null;
}
