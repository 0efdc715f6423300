import { leastOnUnit } from './least-on-unit';

/** Part of trials at probability p, or, at p = 0 with N unknown, of the Poisson part. */
export interface CurveAtom {
  p: number;
  /** Its cumulants κ1 …, in σ away from the target. */
  point: number[];
  /** What its whole weight stands for: trials (N known), or mean count (N unknown). 0 for no trials at all. */
  mass: number;
}

/** Cumulants of one trial in powers of p: p, p − p², p − 3p² + 2p³, p − 7p² + 12p³ − 6p⁴. */
const POWERS = [
  [1, 0, 0, 0],
  [1, -1, 0, 0],
  [1, -3, 2, 0],
  [1, -7, 12, -6]
];

/**
 * The cumulants that independent trials can have are the convex hull of a curve, here shifted to a target and measured
 * in its errors. N known: N·c(p), c the cumulants of one trial. N unknown: nothing, and M·c(p)/p, trials of mean M in
 * all, with the Poisson law at p = 0; M is beyond any mean that the nearest point can have.
 */
export interface TrialCurve {
  /** The atom that lies furthest against a direction. */
  least(direction: number[]): CurveAtom;
  /** Atoms to begin with. */
  starts: CurveAtom[];
}

export function trialCurve(trials: number | null, target: number[], errors: number[]): TrialCurve {
  const powers = POWERS.slice(0, target.length);
  const far = Math.sqrt(target.reduce((sum, value, i) => sum + (value / errors[i]) ** 2, 0));
  // Nothing at all lies `far` from the target, so the nearest point lies no further.
  const mass = trials ?? Math.abs(target[0]) + errors[0] * far;
  const shift = trials === null ? 0 : 1;
  const atom = (p: number, weight = mass): CurveAtom => ({
    p,
    mass: weight,
    point: powers.map((row, i) => {
      const sum = row[0] + p * (row[1] + p * (row[2] + p * row[3]));
      return (weight * sum * (shift ? p : 1) - target[i]) / errors[i];
    })
  });
  const nothing = atom(0, 0);
  return {
    least(direction) {
      const a = [0, 0, 0, 0, 0];
      powers.forEach((row, i) => {
        row.forEach((value, r) => (a[r + shift] += (mass * value * direction[i]) / errors[i]));
      });
      const best = atom(leastOnUnit(a));
      const along = (one: CurveAtom) => one.point.reduce((sum, x, i) => sum + x * direction[i], 0);
      return trials === null && along(nothing) < along(best) ? nothing : best;
    },
    starts: [trials === null ? nothing : atom(0)]
  };
}
