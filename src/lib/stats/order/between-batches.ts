import type { BatchIndex } from './batch-index';

/**
 * Sum over batches of n_b (mean_b − mean)², for shots already given as distances from their mean: Σ_b t_b²/n_b,
 * t_b the sum of batch b. Subtracting the mean first keeps the digits when counts are large and alike.
 */
export function betweenBatches(distances: Float64Array, { of, sizes }: BatchIndex): number {
  const sums = new Float64Array(sizes.length);
  for (let i = 0; i < distances.length; i++) sums[of[i]] += distances[i];
  let total = 0;
  for (let b = 0; b < sums.length; b++) total += (sums[b] * sums[b]) / sizes[b];
  return total;
}
