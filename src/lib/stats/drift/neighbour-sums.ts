import { batchIndex } from '../order/batch-index';

/** How neighbouring shots of the same batch go together. */
export interface NeighbourSums {
  /** Pairs of neighbouring shots, S − B. */
  pairs: number;
  /** Half the mean square of their differences: the variance with every slow change taken out. */
  steady: number;
  /** Σ d_i·d_{i+1} over those pairs, d the distance of a shot from the mean of its batch, over Σ d². */
  correlation: number;
  /** Σ d_i·d_{i+1} in standard deviations above what every order of the shots within their batches gives on average. */
  score: number;
}

/**
 * Neighbouring shots of one batch, against every order in which its shots could have come.
 *
 * Of a batch of n with power sums S2, S4 of its distances from the mean, all n! orders give Σ d_i·d_{i+1} a mean of
 * −S2/n and a mean square of (S2² − S4)/n + (S2² − 2·S4)/(n(n − 1)); batches add up.
 *
 * @param shots counts in the order taken
 * @param names batch of each shot; shots of a batch need not follow each other in the list
 * @returns null where no batch has three shots, or none has two different counts
 * Source: Wald & Wolfowitz 1943, Ann. Math. Stat. 14:378; von Neumann 1941, Ann. Math. Stat. 12:367 (m); both moments
 *   held against all orders by the tests.
 */
export function neighbourSums(shots: ArrayLike<number>, names: ArrayLike<string>): NeighbourSums | null {
  const { of, sizes } = batchIndex(names);
  const means = new Float64Array(sizes.length);
  for (let i = 0; i < shots.length; i++) means[of[i]] += shots[i] / sizes[of[i]];
  const last = new Float64Array(sizes.length).fill(NaN);
  const second = new Float64Array(sizes.length);
  const fourth = new Float64Array(sizes.length);
  let [pairs, steps, products] = [0, 0, 0];
  for (let i = 0; i < shots.length; i++) {
    const b = of[i];
    if (sizes[b] < 3) continue;
    const d = shots[i] - means[b];
    second[b] += d * d;
    fourth[b] += d * d * d * d;
    if (!Number.isNaN(last[b])) {
      pairs++;
      steps += (d - last[b]) ** 2;
      products += d * last[b];
    }
    last[b] = d;
  }
  let [square, expected, variance] = [0, 0, 0];
  for (const [b, n] of sizes.entries()) {
    if (n < 3) continue;
    const [s2, s4] = [second[b], fourth[b]];
    square += s2;
    expected -= s2 / n;
    variance += (s2 * s2 - s4) / n + (s2 * s2 - 2 * s4) / (n * (n - 1)) - (s2 / n) ** 2;
  }
  if (!(variance > 0)) return null;
  return {
    pairs,
    steady: steps / (2 * pairs),
    correlation: products / square,
    score: (products - expected) / Math.sqrt(variance)
  };
}
