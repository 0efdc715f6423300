import type { Repeats } from './simulate-power';

/** Experiments without the effect that are drawn at most: half a minute of a processor where counts are many. */
const most = 200_000;
/** Of them so many have to lie beyond the cut, or nobody knows where it is. */
const beyond = 10;

/**
 * Experiments to draw for a level: 200 of those without the effect lie beyond the cut where that can be had, which
 * leaves the power open by a point. With 20 beyond it plans at a level of 0.001 looked up to 6 points off that are
 * within 2.
 *
 * @returns null for a level under 5e-5: so far out no simulation of this size finds the cut
 */
export function repeatsFor(alpha: number): Repeats | null {
  if (!(alpha * most >= beyond)) return null;
  return { without: Math.min(most, Math.max(20_000, Math.ceil(200 / alpha))), with: 4000 };
}
