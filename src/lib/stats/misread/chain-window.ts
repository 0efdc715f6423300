import { deepScale, smallestNormal, type Window } from '../laws/window';
import type { Level } from '../types';

/**
 * Law of the kinks read along an open chain whose sites are sometimes misread: N bonds with independent kinks, N + 1
 * sites each flipped with probability ε, and a kink is read where the two readings of a bond's sites differ.
 *
 * @param blocks kink probabilities in the order of the bonds, as blocks of equal p; Σ trials = N. The order matters
 * @param rate ε, 0 ≤ ε ≤ 1
 * @param trim part of the largest value below which the ends are left out; 0 keeps relative accuracy of about
 *   N·1e-16 for every probability down to 1e-300
 * @param scale what the values are multiplied by; they sum to it
 *
 * Steps along the chain with the flip of the last site as the state, so that only positive terms are added: from the
 * same flip a kink is read with probability p, from the other with 1 − p.
 */
export function chainWindow(blocks: readonly Level[], rate: number, trim = 0, scale = deepScale): Window {
  return stepChain(blocks, rate, [(1 - rate) * scale, rate * scale], trim, scale).window;
}

/** The same from any start: weight of an upright and of a flipped first site. Also the two parts, by the last site. */
export function stepChain(
  blocks: readonly Level[],
  rate: number,
  [upright, flipped]: [number, number],
  trim: number,
  scale: number
): { window: Window; upright: Float64Array; flipped: Float64Array } {
  const bonds = blocks.reduce((sum, { trials }) => sum + trials, 0);
  const f = new Float64Array(bonds + 1);
  const g = new Float64Array(bonds + 1);
  f[0] = upright;
  g[0] = flipped;
  let low = 0;
  let high = 0;
  for (const { p, trials } of blocks) {
    const q = 1 - p;
    for (let bond = 0; bond < trials; bond++) {
      high++;
      let most = 0;
      for (let n = high; n >= low; n--) {
        const before = n > low;
        const fBefore = before ? f[n - 1] : 0;
        const gBefore = before ? g[n - 1] : 0;
        const same = q * f[n] + p * fBefore + p * g[n] + q * gBefore;
        const other = p * f[n] + q * fBefore + q * g[n] + p * gBefore;
        f[n] = (1 - rate) * same;
        g[n] = rate * other;
        if (f[n] + g[n] > most) most = f[n] + g[n];
      }
      const least = Math.max(trim * most, smallestNormal);
      while (high > low && f[high] + g[high] < least) f[high] = g[high--] = 0;
      while (low < high && f[low] + g[low] < least) f[low] = g[low++] = 0;
    }
  }
  const values = new Float64Array(high - low + 1);
  for (let i = 0; i < values.length; i++) values[i] = f[low + i] + g[low + i];
  return {
    window: { first: low, values, scale },
    upright: f.subarray(low, high + 1),
    flipped: g.subarray(low, high + 1)
  };
}
