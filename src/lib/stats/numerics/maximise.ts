const golden = (3 - Math.sqrt(5)) / 2;

/**
 * Largest value of a function of one number on an interval.
 *
 * @param f function with one maximum between the ends (otherwise a local one is found)
 * @param low, high ends of the interval; the ends themselves are compared too
 * @param tolerance largest error of the place, in the units of x; no use below about 1e-8 of its scale, since f
 *   is flat at its maximum
 * @returns the place `at` and the `value` there. A NaN of f counts as −Infinity.
 *
 * Source: Brent 1973, chapter 5 (parabolic steps kept in check by golden sections).
 */
export function maximise(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance: number
): { at: number; value: number } {
  const cost = (x: number) => {
    const value = f(x);
    return Number.isNaN(value) ? Infinity : -value;
  };
  let [left, right] = [low, high];
  let best = left + golden * (right - left);
  let second = best;
  let third = best;
  let fBest = cost(best);
  let fSecond = fBest;
  let fThird = fBest;
  let step = 0;
  let stepBefore = 0;
  for (let count = 0; count < 500; count++) {
    const middle = (left + right) / 2;
    const least = tolerance / 3 + 1e-11 * Math.abs(best);
    if (Math.abs(best - middle) <= 2 * least - (right - left) / 2) break;
    let trial = NaN;
    if (Math.abs(stepBefore) > least) {
      trial = parabola(best, second, third, fBest, fSecond, fThird);
    }
    const usable = Math.abs(trial) < Math.abs(stepBefore) / 2 && best + trial > left && best + trial < right;
    if (usable) {
      stepBefore = step;
      step = trial;
      const close = best + step - left < 2 * least || right - best - step < 2 * least;
      if (close) step = best < middle ? least : -least;
    } else {
      stepBefore = best < middle ? right - best : left - best;
      step = golden * stepBefore;
    }
    const x = best + (Math.abs(step) >= least ? step : Math.sign(step) * least);
    const fx = cost(x);
    if (fx <= fBest) {
      if (x < best) right = best;
      else left = best;
      [third, fThird, second, fSecond, best, fBest] = [second, fSecond, best, fBest, x, fx];
    } else {
      if (x < best) left = x;
      else right = x;
      if (fx <= fSecond || second === best) {
        [third, fThird, second, fSecond] = [second, fSecond, x, fx];
      } else if (fx <= fThird || third === best || third === second) {
        [third, fThird] = [x, fx];
      }
    }
  }
  for (const end of [low, high]) {
    const fEnd = cost(end);
    if (fEnd < fBest) [best, fBest] = [end, fEnd];
  }
  return { at: best, value: -fBest };
}

/** Step from x to the vertex of the parabola through three points; NaN when they lie on a line. */
function parabola(x: number, w: number, v: number, fx: number, fw: number, fv: number): number {
  const r = (x - w) * (fx - fv);
  const q = (x - v) * (fx - fw);
  return ((x - v) * q - (x - w) * r) / (2 * (r - q));
}
