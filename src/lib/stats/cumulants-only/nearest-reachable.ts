import { leastPoint } from './least-point';
import { trialCurve } from './trial-curve';

/** The cumulants of independent trials that lie nearest to given ones. */
export interface NearestReachable {
  /** κ1 … of the nearest point. */
  cumulants: number[];
  /** √χ²: its distance, each cumulant in its own error; 0 inside. */
  distance: number;
  /** No independent trials at all come nearer than this: a bound from a plane that parts them from the target. */
  atLeast: number;
  /** Trials that have these cumulants; their numbers need not be whole. A Poisson part has p = 0. */
  parts: { p: number; mass: number }[];
}

/**
 * Point of the moment body nearest to the target in χ² = Σ((x − κ)/σ)², the errors taken as independent of each other.
 *
 * @param target κ1 … κ2, κ3 or κ4; errors > 0, one for each
 * @param trials N ≥ 1, or null when unknown
 *
 * The atom of the curve that lies furthest against a point is exact (roots of a cubic), and the body is convex, so there
 * is one nearest point (leastPoint).
 */
export function nearestReachable(
  trials: number | null,
  target: number[],
  errors: number[]
): NearestReachable {
  const { point, distance, atLeast, atoms, weights } = leastPoint(trialCurve(trials, target, errors));
  return {
    cumulants: point.map((x, i) => x * errors[i] + target[i]),
    distance,
    atLeast,
    parts: atoms
      .map(({ p, mass }, i) => ({ p, mass: mass * weights[i] }))
      .filter((part) => part.mass > 0)
      .sort((a, b) => a.p - b.p)
  };
}
