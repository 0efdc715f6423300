import { refuseBadP } from './refuse-bad-p';

/**
 * Holm's adjusted p-values with weights, in the order given: with p/w sorted upward, the i-th becomes the largest of
 * (p_j/w_j)·Σ w over those from j on, over j ≤ i, at most 1. Weights fixed before the data are seen keep the chance
 * of any false alarm at α, whatever the dependence; equal weights give Holm's own values.
 *
 * @param p p-values, each 0 … 1
 * @param weights one above 0 for each
 * @throws RangeError for a value outside 0 … 1, a weight not above 0, or another number of weights
 *
 * Source: Holm 1979, Scand. J. Statist. 6:65, section 4.
 */
export function weightedHolm(p: ArrayLike<number>, weights: ArrayLike<number>): number[] {
  refuseBadP(p);
  if (weights.length !== p.length || Array.from(weights).some((weight) => !(weight > 0))) {
    throw new RangeError('a weight above 0 is wanted for each p-value');
  }
  const scaled = Array.from(p, (value, i) => value / weights[i]);
  const order = scaled.map((_, i) => i).sort((i, j) => scaled[i] - scaled[j]);
  const remaining = new Array<number>(p.length);
  let sum = 0;
  for (const index of order.toReversed()) remaining[index] = sum += weights[index];
  const adjusted = new Array<number>(p.length);
  let largest = 0;
  for (const index of order)
    adjusted[index] = largest = Math.max(largest, Math.min(1, scaled[index] * remaining[index]));
  return adjusted;
}
