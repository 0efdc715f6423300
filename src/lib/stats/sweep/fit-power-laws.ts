import { chiSquareTail } from '../numerics/chi-square-tail';
import { solveSymmetric } from '../numerics/solve-symmetric';
import { inverseSymmetric } from './inverse-symmetric';
import { powerLawSlope } from './power-law-slope';

/** Quantities of one dataset that are each to follow a power law of the time, and the covariance of their errors. */
export interface SweepPoint {
  /** ln τ. */
  logTime: number;
  values: number[];
  /** values.length squared, row by row. */
  covariance: number[];
}

/** Power laws fitted together. */
export interface PowerLaws {
  /** b of each quantity in y = e^c τ^−b; equal where they were tied. */
  exponents: number[];
  /** Standard error of each. */
  errors: number[];
  /** ln of each quantity where ln τ is the middle of the window. */
  logLevels: number[];
  /** The middle: the mean of ln τ over the points. */
  middle: number;
  chiSquare: number;
  /** Values less parameters. */
  freedom: number;
  /** P(χ² at least this large) if power laws hold; null without freedom. */
  p: number | null;
}

/** Steps at most: from points that lie near power laws five are enough. */
const mostSteps = 60;

/**
 * A step that gains less than this of χ² is the last: 1e-16 leaves each parameter within 1e-8 of its standard error.
 * Below 1e-6 steps are not compared any more, since rounding of χ² itself would refuse good ones.
 */
const [lastGain, sureGain] = [1e-16, 1e-6];

/**
 * Generalised least squares of power laws y_q = exp(c_q − b_q (ln τ − middle)) to the values themselves, not to their
 * logarithms: a third cumulant that came out small or negative by chance has then its say with its own error, where on a
 * log axis it would weigh too much or be left out, and the exponents would lean.
 *
 * @param tied one exponent for all quantities instead of one for each
 * @param weights inverse of each covariance, where the caller has them; null for a singular one
 * @returns null with fewer than 2 points, with times that are all equal, where a covariance is singular, or where the
 *   values allow no power law (a quantity that is not positive by its weighted mean)
 *
 * Source: Aitken 1936, Proc. Roy. Soc. Edinburgh 55:42 (generalised least squares), with Gauss–Newton steps.
 */
export function fitPowerLaws(
  points: SweepPoint[],
  tied: boolean,
  weights = points.map(({ covariance, values }) => inverseSymmetric(covariance, values.length))
): PowerLaws | null {
  const size = points[0]?.values.length ?? 0;
  if (points.length < 2 || size === 0) return null;
  const middle = points.reduce((sum, { logTime }) => sum + logTime, 0) / points.length;
  const x = points.map(({ logTime }) => logTime - middle);
  if (x.every((one) => Math.abs(one - x[0]) < 1e-9)) return null;
  const known = weights.filter((weight) => weight !== null);
  if (known.length < points.length) return null;
  const start = startingPoint(points, x, size, tied);
  if (!start) return null;
  const parameters = start.length;
  const values = points.map((point) => point.values);
  const slopeAt = (place: number[]) => powerLawSlope(place, x, values, known);
  let at = start;
  let state = slopeAt(at);
  for (let step = 0; step < mostSteps; step++) {
    const move = solveSymmetric(state.normal, parameters, state.gradient);
    const gain = move.reduce((sum, one, i) => sum + one * state.gradient[i], 0);
    const from = at;
    const reach = (length: number) => from.map((value, i) => value + length * move[i]);
    let length = 1;
    let next = slopeAt(reach(length));
    while (gain > sureGain && !(next.chiSquare <= state.chiSquare) && length > 1e-6) {
      length /= 2;
      next = slopeAt(reach(length));
    }
    if (gain > sureGain && !(next.chiSquare <= state.chiSquare)) break;
    at = reach(length);
    state = next;
    if (!(gain > lastGain)) break;
  }
  const variances = inverseSymmetric([...state.normal], parameters);
  if (!variances) return null;
  const slopeOf = (q: number) => size + (tied ? 0 : q);
  const each = Array.from({ length: size }, (_, q) => q);
  const freedom = points.length * size - parameters;
  return {
    exponents: each.map((q) => at[slopeOf(q)]),
    errors: each.map((q) => Math.sqrt(variances[slopeOf(q) * (parameters + 1)])),
    logLevels: at.slice(0, size),
    middle,
    chiSquare: state.chiSquare,
    freedom,
    p: freedom > 0 ? chiSquareTail(state.chiSquare, freedom) : null
  };
}

/** Levels and slopes to begin from: a straight line through the logarithms of what is positive, each alone. */
function startingPoint(points: SweepPoint[], x: number[], size: number, tied: boolean): number[] | null {
  const levels: number[] = [];
  const slopes: number[] = [];
  for (let q = 0; q < size; q++) {
    const sums = [0, 0, 0, 0, 0];
    points.forEach(({ values, covariance }, i) => {
      if (!(values[q] > 0)) return;
      const weight = values[q] ** 2 / covariance[q * (size + 1)];
      const y = Math.log(values[q]);
      [1, x[i], y, x[i] * x[i], x[i] * y].forEach((term, k) => (sums[k] += weight * term));
    });
    const [w, wx, wy, wxx, wxy] = sums;
    if (!(w > 0)) return null;
    const spread = wxx - (wx * wx) / w;
    const slope = spread > 1e-9 * w ? (wxy - (wx * wy) / w) / spread : 0;
    levels.push((wy - slope * wx) / w);
    slopes.push(-slope);
  }
  // The first quantity is the best known: tied fits begin from its exponent.
  return [...levels, ...(tied ? [slopes[0]] : slopes)];
}
