import { affineWeights } from './affine-weights';
import { trialCurve, type CurveAtom } from './trial-curve';

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

const dot = (a: number[], b: number[]): number => a.reduce((sum, x, i) => sum + x * b[i], 0);

/**
 * Point of the moment body nearest to the target in χ² = Σ((x − κ)/σ)², the errors taken as independent of each other.
 *
 * @param target κ1 … κ2, κ3 or κ4; errors > 0, one for each
 * @param trials N ≥ 1, or null when unknown
 *
 * Wolfe's algorithm for the point of least norm: the hull of a few atoms of the curve is grown by the atom that lies
 * furthest against the point found, and that atom is exact (roots of a cubic). The body is convex, so there is one
 * nearest point, and the plane through it bounds the distance from below: the two agree to about 1e-6.
 * Source: Wolfe 1976, Math. Programming 11:128 (m).
 */
export function nearestReachable(
  trials: number | null,
  target: number[],
  errors: number[]
): NearestReachable {
  const curve = trialCurve(trials, target, errors);
  let atoms = [...curve.starts];
  let weights = [1];
  let point = [...atoms[0].point];
  let atLeast = 0;
  for (let round = 0; round < 300; round++) {
    const norm = Math.sqrt(dot(point, point));
    if (norm <= inside) break;
    const next = curve.least(point);
    atLeast = Math.max(atLeast, dot(next.point, point) / norm);
    if (norm - atLeast <= 1e-9 * (1 + norm)) break;
    const grown = settle([...atoms, next], [...weights, 0]);
    const moved = combine(grown.atoms, grown.weights);
    if (!(dot(moved, moved) < norm * norm)) break;
    ({ atoms, weights } = grown);
    point = moved;
  }
  const norm = Math.sqrt(dot(point, point));
  return {
    cumulants: point.map((x, i) => x * errors[i] + target[i]),
    distance: norm <= inside ? 0 : norm,
    atLeast: norm <= inside ? 0 : Math.min(atLeast, norm),
    parts: atoms
      .map(({ p, mass }, i) => ({ p, mass: mass * weights[i] }))
      .filter((part) => part.mass > 0)
      .sort((a, b) => a.p - b.p)
  };
}

/** A millionth of an error: a target on an edge counts as inside. */
const inside = 1e-6;

/** Weights of least norm over the hull of the atoms, dropping atoms whose weight would turn negative. */
function settle(atoms: CurveAtom[], weights: number[]): { atoms: CurveAtom[]; weights: number[] } {
  for (;;) {
    const wanted = affineWeights(atoms.map(({ point }) => point));
    if (!wanted) {
      // Two atoms as good as one: the older of the nearest pair gives its weight to the newest.
      const last = atoms.length - 1;
      const near = nearestTo(atoms, last);
      weights[last] += weights[near];
      atoms.splice(near, 1);
      weights.splice(near, 1);
      if (atoms.length === 1) return { atoms, weights: [1] };
      continue;
    }
    if (wanted.every((weight) => weight > 1e-15)) return { atoms, weights: wanted };
    let step = 1;
    wanted.forEach((weight, i) => {
      if (weight <= 1e-15) step = Math.min(step, weights[i] / Math.max(weights[i] - weight, 1e-300));
    });
    const moved = weights.map((weight, i) => weight + step * (wanted[i] - weight));
    const kept = moved.map((weight, i) => weight > 1e-15 || (wanted[i] > 1e-15 && weight > 0));
    if (kept.every(Boolean)) kept[moved.indexOf(Math.min(...moved))] = false;
    atoms = atoms.filter((_, i) => kept[i]);
    weights = moved.filter((_, i) => kept[i]);
    const sum = weights.reduce((a, b) => a + b, 0);
    weights = weights.map((weight) => weight / sum);
  }
}

function nearestTo(atoms: CurveAtom[], which: number): number {
  let best = -1;
  let least = Infinity;
  atoms.forEach(({ p, mass }, i) => {
    const away = Math.abs(p - atoms[which].p) + (mass === atoms[which].mass ? 0 : 2);
    if (i !== which && away < least) [best, least] = [i, away];
  });
  return best;
}

function combine(atoms: CurveAtom[], weights: number[]): number[] {
  return atoms[0].point.map((_, i) => atoms.reduce((sum, { point }, j) => sum + weights[j] * point[i], 0));
}
