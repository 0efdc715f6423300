import { leastPoint } from './least-point';
import { trialCurve, type CurveAtom } from './trial-curve';

/**
 * Whether rounding alone can have put cumulants outside what independent trials have: whether the box of all numbers that
 * round to the printed ones meets the moment body.
 *
 * They meet where 0 is among the differences of a point of the body and one of the box. These are convex too, and their
 * point of least norm has bounds from either side (leastPoint), here in half units: true where it is 0, false where a
 * plane parts body and box, null where neither is sure.
 *
 * @param values printed cumulants, κ1 first
 * @param halves half a unit of the last digit of each, > 0
 */
export function roundingReaches(trials: number | null, values: number[], halves: number[]): boolean | null {
  const curve = trialCurve(trials, values, halves);
  /** Less the corner of the box that lies furthest along a direction; `mass` tells the corners apart. */
  const less = ({ p, point }: CurveAtom, corner: number[]): CurveAtom => ({
    p,
    point: point.map((x, i) => x - corner[i]),
    mass: corner.reduce((code, side) => 3 * code + side, 0)
  });
  const sides = (direction: number[]) => direction.map((x) => (x < 0 ? -1 : 1));
  const { distance, atLeast } = leastPoint({
    least: (direction) => less(curve.least(direction), sides(direction)),
    starts: curve.starts.map((atom) => less(atom, sides(atom.point)))
  });
  if (distance === 0) return true;
  return atLeast > surely ? false : null;
}

/** In half units; leastPoint takes a millionth for none. */
const surely = 1e-5;
