import type { Window } from '../laws/window';
import type { Histogram } from '../types';

/**
 * Variance of a law when every count of a lump counts as the one nearest to the others: of min(X, from), of max(X, to),
 * or of both. Both are contractions, so it is at most the variance of X.
 */
export function clampedVariance(
  { first, values, scale }: Window,
  { lump, below }: Pick<Histogram, 'lump' | 'below'>
): number {
  const count = (i: number) => Math.max(below?.to ?? 0, Math.min(lump?.from ?? Infinity, first + i));
  const mean = values.reduce((sum, f, i) => sum + (f / scale) * count(i), 0);
  return values.reduce((sum, f, i) => sum + (f / scale) * (count(i) - mean) ** 2, 0);
}
