import { commonExponent } from './common-exponent';
import type { SweepPoint } from './fit-power-laws';
import { weighPoints } from './weigh-points';

/** The common exponent of the points from one to another. */
export interface WindowExponent {
  /** First and last point of the window, counted from 0 in order of time. */
  from: number;
  to: number;
  exponent: number;
  error: number;
  /** P of the test of one exponent. */
  commonP: number;
  /** P of the fit of separate power laws; null without freedom. */
  fitP: number | null;
}

/** Fewest points of a window: two lie on any power law. */
export const FEWEST_POINTS = 3;

/**
 * How the common exponent moves as points are left off one end of the sweep, the other end kept: what a reader asks of
 * a fit whose window was chosen. 2(m − 3) + 1 fits for m points.
 *
 * @param points in order of time
 */
export function windowExponents(points: SweepPoint[]): WindowExponent[] {
  const last = points.length - 1;
  const weighed = weighPoints(points);
  const windows = [[0, last]];
  for (let from = 1; last - from + 1 >= FEWEST_POINTS; from++) windows.push([from, last]);
  for (let to = last - 1; to + 1 >= FEWEST_POINTS; to--) windows.push([0, to]);
  return windows.flatMap(([from, to]) => {
    const held = <T>(all: T[]) => all.slice(from, to + 1);
    const common = commonExponent(
      held(points),
      weighed.map((one) => ({ ...one, points: held(one.points), weights: held(one.weights) }))
    );
    if (!common) return [];
    const { tied, free, p } = common;
    return [{ from, to, exponent: tied.exponents[0], error: tied.errors[0], commonP: p, fitP: free.p }];
  });
}
