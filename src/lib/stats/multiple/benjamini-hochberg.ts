import { refuseBadP } from './refuse-bad-p';

/**
 * Benjamini and Hochberg's adjusted p-values, in the order given: with p sorted upward, the i-th of m becomes the
 * smallest of m·p_j/j over j ≥ i. Rejecting what is at or under q keeps the expected share of false alarms among
 * the rejections at q, for independent or positively dependent tests.
 *
 * @param p p-values, each 0 … 1; an empty list gives an empty list
 * @throws RangeError for a value outside 0 … 1, NaN included
 *
 * Source: Benjamini & Hochberg 1995, J. R. Statist. Soc. B 57:289.
 */
export function benjaminiHochberg(p: ArrayLike<number>): number[] {
  refuseBadP(p);
  const order = Array.from(p, (_, i) => i).sort((i, j) => p[j] - p[i]);
  const adjusted = new Array<number>(p.length);
  let smallest = 1;
  order.forEach((index, fromTop) => {
    smallest = Math.min(smallest, (p.length * p[index]) / (p.length - fromTop));
    adjusted[index] = smallest;
  });
  return adjusted;
}
