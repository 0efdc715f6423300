import type { Workspace } from './workspace';

/** Sums over the counts with one and with two trials taken out, Σ bent·g and Σ bent·gg. */
export interface RemovalSums {
  single: number;
  double: number;
}

/**
 * Takes one trial of probability p out of the pmf in the workspace, into space.g, and a second one without
 * keeping it; both are weighed with space.bent on the way.
 *
 * The same recursions as removeTrial, but one pass for what would be four: each step waits for the one before,
 * and two such chains in one loop take the time of one. Counts that no observed cell needs are left out: those
 * above the last when solving upward, those below the first when solving downward.
 *
 * @param twice whether a second trial is there to be taken
 * @param sums receives the result; `double` is 0 without a second trial
 */
export function levelRemoval(space: Workspace, p: number, twice: boolean, sums: RemovalSums): void {
  const { data, f, g, bent, length } = space;
  const shift = data.first - space.first;
  let single = 0;
  let double = 0;
  if (p <= 0.5) {
    // A tail is made of all counts above.
    const end = data.lump ? length : Math.min(length, Math.max(0, shift + data.shots.length));
    const over = 1 / (1 - p);
    const ratio = p * over;
    let one = 0;
    let two = 0;
    for (let n = 0; n < end; n++) {
      one = f[n] * over - ratio * one;
      two = one * over - ratio * two;
      g[n] = one;
      single += bent[n] * one;
      double += bent[n] * two;
    }
  } else {
    // A head is made of all counts below.
    const start = space.emptySingle !== 0 || data.below ? 0 : Math.max(0, shift - 2);
    const over = 1 / p;
    const ratio = (1 - p) * over;
    let one = 0;
    let two = 0;
    g[length - 1] = 0;
    for (let n = length - 1; n > start; n--) {
      two = one * over - ratio * two;
      one = f[n] * over - ratio * one;
      g[n - 1] = one;
      single += bent[n - 1] * one;
      double += bent[n - 1] * two;
    }
  }
  sums.single = single;
  sums.double = twice ? double : 0;
}
