import { deepScale, smallestNormal, type Window } from '../laws/window';
import type { Level } from '../types';
import { stepChain } from './chain-window';

/**
 * Law of the kinks read on a ring of N bonds and N sites, each site flipped with probability ε.
 *
 * The model: kinks are independent, given that their number is even (round a ring it must be). A flip toggles the two
 * bonds of its site and keeps the parity, so only even counts are read, and the law is the even part of what the
 * same independent kinks would give without that condition, divided by its sum.
 *
 * @param blocks kink probabilities in the order of the bonds, as blocks of equal p; N ≥ 3 bonds
 * @param rate ε, 0 ≤ ε ≤ 1
 * @param trim part of the largest value below which the ends are left out while stepping, as in chainWindow
 * @returns values at every count of the window; 0 at odd ones. Their sum is `scale`, but for what is summed
 * @throws RangeError for fewer than 3 bonds (with two, both bonds join the same sites), and where no even number of kinks is possible
 *
 * For each flip of the first site the chain is stepped to the last site, and the last bond then closes onto the first:
 * positive terms only.
 */
export function ringWindow(blocks: readonly Level[], rate: number, scale = deepScale, trim = 0): Window {
  const present = blocks.filter(({ trials }) => trials > 0);
  const bonds = present.reduce((sum, { trials }) => sum + trials, 0);
  if (bonds < 3) throw new RangeError(`a ring of ${bonds} bonds`);
  const last = present[present.length - 1];
  const open = [...present.slice(0, -1), { p: last.p, trials: last.trials - 1 }];
  const values = new Float64Array(bonds + 1);
  for (const first of [0, 1]) {
    const start: [number, number] = first === 0 ? [(1 - rate) * scale, 0] : [0, rate * scale];
    const { window, upright, flipped } = stepChain(open, rate, start, trim, scale);
    // Where first and last site are both upright or both flipped, the closing bond is read as it is.
    const [same, other] = first === 0 ? [upright, flipped] : [flipped, upright];
    for (let i = 0; i < same.length; i++) {
      values[window.first + i] += (1 - last.p) * same[i] + last.p * other[i];
      values[window.first + i + 1] += last.p * same[i] + (1 - last.p) * other[i];
    }
  }
  let even = 0;
  for (let n = 0; n <= bonds; n += 2) even += values[n];
  if (!(even > 0)) throw new RangeError('no even number of kinks is possible');
  let low = 0;
  let high = bonds - (bonds % 2);
  while (low < high && values[low] < smallestNormal) low += 2;
  while (high > low && values[high] < smallestNormal) high -= 2;
  const kept = values.slice(low, high + 1);
  for (let i = 0; i < kept.length; i++) kept[i] = i % 2 === 0 ? kept[i] * (scale / even) : 0;
  return { first: low, values: kept, scale };
}
