import { affineWeights } from './affine-weights';
import type { CurveAtom, TrialCurve } from './trial-curve';

/** Point of least norm of a convex hull. */
export interface LeastPoint {
  point: number[];
  /** Its norm; 0 inside. */
  distance: number;
  /** No point of the hull is nearer than this: a bound from a plane that parts it from the origin. */
  atLeast: number;
  atoms: CurveAtom[];
  weights: number[];
}

/**
 * Wolfe's algorithm: the hull of a few atoms is grown by the atom that lies furthest against the point found, and the plane
 * through that point bounds the distance from below; the two agree to about 1e-6.
 *
 * Source: Wolfe 1976, Math. Programming 11:128 (m).
 */
export function leastPoint(curve: TrialCurve): LeastPoint {
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
  const within = norm <= inside;
  return {
    point,
    distance: within ? 0 : norm,
    atLeast: within ? 0 : Math.min(atLeast, norm),
    atoms,
    weights
  };
}

const dot = (a: number[], b: number[]): number => a.reduce((sum, x, i) => sum + x * b[i], 0);

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
