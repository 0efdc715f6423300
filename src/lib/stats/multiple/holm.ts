import { refuseBadP } from './refuse-bad-p';

/**
 * Holm's adjusted p-values, in the order given: with p sorted upward, the i-th of m becomes the largest of
 * (m − j + 1)·p_j over j ≤ i, at most 1. Rejecting what is at or under α keeps the chance of any false alarm at α,
 * whatever the dependence between the tests.
 *
 * @param p p-values, each 0 … 1; an empty list gives an empty list
 * @throws RangeError for a value outside 0 … 1, NaN included
 *
 * Source: Holm 1979, Scand. J. Statist. 6:65.
 */
export function holm(p: ArrayLike<number>): number[] {
  refuseBadP(p);
  const order = Array.from(p, (_, i) => i).sort((i, j) => p[i] - p[j]);
  const adjusted = new Array<number>(p.length);
  let largest = 0;
  order.forEach((index, rank) => {
    largest = Math.max(largest, Math.min(1, (p.length - rank) * p[index]));
    adjusted[index] = largest;
  });
  return adjusted;
}
