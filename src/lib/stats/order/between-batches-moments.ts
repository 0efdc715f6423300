/**
 * Mean and variance of Σ_b t_b²/n_b over all orders of the shots, exact: t_b is the sum of batch b, the shots are
 * distances from their mean. By the moments of sampling without replacement, with p_2 = Σx², p_4 = Σx⁴ and the
 * sums over distinct shots Σx_i²x_j² = p_2² − p_4, Σx_i³x_j = −p_4, Σx_i²x_jx_k = 2p_4 − p_2²,
 * Σx_ix_jx_kx_l = 3p_2² − 6p_4.
 *
 * @param sizes shots in each batch, all ≥ 1
 * @param square p_2, and `fourth` p_4
 *
 * Source: as for the permutation analysis of variance of Pitman 1938, Biometrika 29:322 (m); derived anew and held
 * to full enumeration by the tests.
 */
export function betweenBatchesMoments(
  sizes: ArrayLike<number>,
  square: number,
  fourth: number
): { mean: number; variance: number } {
  let shots = 0;
  for (let b = 0; b < sizes.length; b++) shots += sizes[b];
  // Odds of naming 2, 3, 4 distinct shots in turn; no batch needs more than there are.
  const two = shots * (shots - 1);
  const three = two * Math.max(1, shots - 2);
  const four = three * Math.max(1, shots - 3);
  const pairs = (square * square - fourth) / two;
  const triples = (2 * fourth - square * square) / three;
  const fours = (3 * square * square - 6 * fourth) / four;

  // Sums over batches: E[t_b⁴]/n_b², and for two batches E[t_b² t_c²]/(n_b n_c), a quadratic form in n − 1.
  let own = 0;
  let others = 0;
  let othersSquared = 0;
  for (let b = 0; b < sizes.length; b++) {
    const n = sizes[b];
    const m = n - 1;
    const forth = n * (fourth / shots) + n * m * (3 * pairs - 4 * (fourth / two));
    own += (forth + n * m * (n - 2) * (6 * triples + (n - 3) * fours)) / (n * n);
    others += m;
    othersSquared += m * m;
  }
  const batches = sizes.length;
  const cross =
    batches * (batches - 1) * pairs +
    2 * (batches - 1) * others * triples +
    (others * others - othersSquared) * fours;
  const mean = ((batches - 1) * square) / (shots - 1);
  return { mean, variance: own + cross - mean * mean };
}
