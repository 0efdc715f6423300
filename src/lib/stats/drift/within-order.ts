import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import { normalCdf } from '../numerics/normal-cdf';
import { neighbourSums } from './neighbour-sums';
import { surest } from './surest';
import type { BatchOrder } from './types';
import type { WithinBatches } from './within-batches';

/** Fewer pairs of neighbours than this are not asked: their sum is not normal yet. */
const fewest = 50;

/** Level at which neighbours resemble each other. Not the α of the answer: a drift missed would be told as interaction. */
const level = 0.05;

/**
 * Whether the rate moved inside batches too: neighbouring shots of a batch then resemble each other, and between them
 * the variance is smaller than within the batch.
 *
 * A slow change that makes an excess x within batches makes a correlation of about x, seen with a score of x·√S where
 * the excess itself has x·√(S/2): an excess that drift makes and that is seen at 1 % has a median score of 3.3 here. A
 * cause that acts shot by shot leaves no order. Limits of the steady variance over the ceiling by chi-square, with the
 * relative variance of half the mean square difference, one pair-th more than that of the variance itself.
 *
 * @param found of the same shots and batches, for its ceiling and its freedom
 * @returns null for fewer than 50 pairs of neighbours, or shots all alike
 * Source: von Neumann, Kent, Bellinson & Hart 1941, Ann. Math. Stat. 12:153 (m).
 */
export function withinOrder(
  shots: ArrayLike<number>,
  names: ArrayLike<string>,
  { ceiling, freedom, shape }: Pick<WithinBatches, 'ceiling' | 'freedom' | 'shape'>
): BatchOrder | null {
  const sums = neighbourSums(shots, names);
  if (!sums || sums.pairs < fewest || shape === null || !(ceiling > 0)) return null;
  const { pairs, steady, correlation, score } = sums;
  const value = steady / ceiling;
  // Var/value² is 2/shape for the variance; 1/pairs more for differences: (3 + γ)/pairs for (2 + γ)/freedom.
  const even = Math.max(1, 2 / ((2 * freedom) / (shape * pairs) + 1 / pairs));
  const { low, high } = evenDispersionFactors(even + 1, null, 0.025);
  const p = Math.max(surest, normalCdf(-score));
  return {
    correlation,
    p,
    dispersion: { value, low: value * low, high: value * high },
    moved: p <= level
  };
}
