import type { Point } from './picture';

/** Equal trials of this mean, where N is known, and the Poisson law: their ratios κ2/κ1 and κ3/κ1. */
export function namedLaws(share: number): { name: string; at: Point }[] {
  const poisson = { name: 'Poisson', at: [1, 1] as Point };
  if (share === 0) return [poisson];
  return [{ name: 'equal trials', at: [1 - share, (1 - share) * (1 - 2 * share)] }, poisson];
}
