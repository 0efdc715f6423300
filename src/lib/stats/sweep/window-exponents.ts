import { holm } from '../multiple/holm';
import { chiSquareTail } from '../numerics/chi-square-tail';
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
  /** P(an exponent so far from the first window's), all windows allowed for by Holm's rule; null for the first. */
  awayP: number | null;
  /** P of the fit of separate power laws; null without freedom. */
  fitP: number | null;
}

/** Fewest points of a window: two lie on any power law. */
export const FEWEST_POINTS = 3;

/**
 * How the common exponent moves as points are left off one end of the sweep, the other end kept: what a reader asks of
 * a fit whose window was chosen. 2(m − 3) + 1 fits for m points.
 *
 * A part of the data and the whole of it are not independent: the variance of the difference of their exponents is the
 * difference of the variances (Hausman 1978, Econometrica 46:1251).
 *
 * @param points in order of time
 */
export function windowExponents(points: SweepPoint[]): WindowExponent[] {
  const last = points.length - 1;
  const weighed = weighPoints(points);
  const windows = [[0, last]];
  for (let from = 1; last - from + 1 >= FEWEST_POINTS; from++) windows.push([from, last]);
  for (let to = last - 1; to + 1 >= FEWEST_POINTS; to--) windows.push([0, to]);
  const found = windows.flatMap(([from, to]) => {
    const held = <T>(all: T[]) => all.slice(from, to + 1);
    const common = commonExponent(
      held(points),
      weighed.map((one) => ({ ...one, points: held(one.points), weights: held(one.weights) }))
    );
    if (!common) return [];
    const { tied, free, p } = common;
    return [{ from, to, exponent: tied.exponents[0], error: tied.errors[0], commonP: p, fitP: free.p }];
  });
  return withDistance(found, last);
}

function withDistance(found: Omit<WindowExponent, 'awayP'>[], last: number): WindowExponent[] {
  const whole = found.find(({ from, to }) => from === 0 && to === last);
  const chances = found.map(({ exponent, error }) => {
    const spread = whole ? error ** 2 - whole.error ** 2 : 0;
    return whole && spread > 0 ? chiSquareTail((exponent - whole.exponent) ** 2 / spread, 1) : 1;
  });
  const others = found.flatMap((one, i) => (one === whole ? [] : [i]));
  const raised = holm(others.map((i) => chances[i]));
  return found.map((one, i) => ({
    ...one,
    awayP: whole && one !== whole ? raised[others.indexOf(i)] : null
  }));
}
