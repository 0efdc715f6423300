import { logFactorial } from '../numerics/log-factorial';
import type { Generator } from './generator';

/**
 * One draw from the hypergeometric law: how many of `marked` things are among `taken` ones drawn without putting back
 * from marked + others. Exact in law but for rounding of the first probability (1e-12 relative at 10^4 things, 1e-6
 * at 10^9).
 *
 * Inversion outward from the mode, one count up and one down in turn, so the time grows as the standard deviation.
 *
 * @param marked, others, taken whole numbers ≥ 0, taken ≤ marked + others, all below 2^53
 * @returns an integer max(0, taken − others) … min(marked, taken)
 * @throws RangeError for anything else
 *
 * Source: Kachitvichyanukul & Schmeiser 1985, J. Stat. Comput. Simul. 22:127, algorithm HIN, begun at the mode (m).
 */
export function hypergeometricSample(
  generator: Generator,
  marked: number,
  others: number,
  taken: number
): number {
  for (const size of [marked, others, taken]) {
    if (!Number.isSafeInteger(size) || size < 0) throw new RangeError(`not a number of things: ${size}`);
  }
  const all = marked + others;
  if (taken > all) throw new RangeError(`${taken} taken of ${all}`);
  const least = Math.max(0, taken - others);
  const most = Math.min(marked, taken);
  if (least === most) return least;
  const mode = Math.min(most, Math.max(least, Math.floor(((marked + 1) / (all + 2)) * (taken + 1))));
  const atMode = Math.exp(logChosen(marked, mode) + logChosen(others, taken - mode) - logChosen(all, taken));
  // f(k+1)/f(k) = (marked − k)(taken − k) / ((k + 1)(others − taken + k + 1)).
  const spare = others - taken;
  for (;;) {
    let u = generator.next() - atMode;
    if (u < 0) return mode;
    let [up, down, above, below] = [mode, mode, atMode, atMode];
    while (up < most || down > least) {
      if (up < most) {
        above *= ((marked - up) * (taken - up)) / ((up + 1) * (spare + up + 1));
        up++;
        u -= above;
        if (u < 0) return up;
      }
      if (down > least) {
        below *= (down * (spare + down)) / ((marked - down + 1) * (taken - down + 1));
        down--;
        u -= below;
        if (u < 0) return down;
      }
      // Both ends have run out: what is left of u is rounding, or a tail under 1e-300.
      if (above + below < 1e-300) break;
    }
  }
}

/** ln of the number of ways to choose k of n. */
function logChosen(n: number, k: number): number {
  return logFactorial(n) - logFactorial(k) - logFactorial(n - k);
}
