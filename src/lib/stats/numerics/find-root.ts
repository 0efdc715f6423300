/**
 * A zero of a continuous function between two points where its signs differ.
 *
 * @param f function of one number
 * @param low, high ends of the bracket; f must have different signs (or a zero) there
 * @param tolerance largest error of the answer, in the units of x; 0 (the default) for all digits
 * @returns NaN when the signs do not differ or f gives NaN at an end
 *
 * Source: Brent 1973, Algorithms for Minimization without Derivatives, chapter 4 (inverse quadratic
 * interpolation kept in check by bisection).
 */
export function findRoot(f: (x: number) => number, low: number, high: number, tolerance = 0): number {
  let best = high;
  let fBest = f(best);
  let previous = low;
  let fPrevious = f(previous);
  if (fBest === 0) return best;
  if (fPrevious === 0) return previous;
  if (!(fBest * Math.sign(fPrevious) < 0)) return NaN;
  let other = previous;
  let fOther = fPrevious;
  let step = best - previous;
  let stepBefore = step;
  for (let count = 0; count < 200; count++) {
    if (Math.sign(fBest) === Math.sign(fOther)) {
      other = previous;
      fOther = fPrevious;
      step = stepBefore = best - previous;
    }
    if (Math.abs(fOther) < Math.abs(fBest)) {
      [previous, best, other] = [best, other, best];
      [fPrevious, fBest, fOther] = [fBest, fOther, fBest];
    }
    const least = 2 * Number.EPSILON * Math.abs(best) + tolerance / 2;
    const half = (other - best) / 2;
    if (Math.abs(half) <= least || fBest === 0) return best;
    const trial =
      Math.abs(stepBefore) >= least && Math.abs(fPrevious) > Math.abs(fBest)
        ? interpolate(best, previous, other, fBest, fPrevious, fOther)
        : NaN;
    const inside = Math.sign(trial) === Math.sign(half) && Math.abs(trial) < 1.5 * Math.abs(half) - least / 2;
    if (inside && Math.abs(trial) < Math.abs(stepBefore) / 2) {
      stepBefore = step;
      step = trial;
    } else {
      step = stepBefore = half;
    }
    previous = best;
    fPrevious = fBest;
    best += Math.abs(step) > least ? step : Math.sign(half) * least;
    fBest = f(best);
  }
  return best;
}

/** Step from `b` to the zero of the inverse parabola through three points, or of the line through two. */
function interpolate(b: number, a: number, c: number, fb: number, fa: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1);
  const t = fa / fc;
  const r = fb / fc;
  const p = s * ((c - b) * t * (t - r) - (b - a) * (r - 1));
  return p / ((1 - t) * (r - 1) * (s - 1));
}
