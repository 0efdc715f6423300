/**
 * Mean and variance of Σ(n − mean)² over the shots of one batch of equal trials, given their total: what is left once
 * the batch's own probability is taken out, exactly.
 *
 * Given the total T, the defects lie on T of the M = shots·N places at random. With π = (N − 1)/(M − 1), the chance that
 * two of them share a shot: mean (shots − 1)·T(M − T)/(shots·(M − 1)), variance
 * 2T(T − 1)(M − T)(M − T − 1)π(1 − π)/((M − 2)(M − 3)). N unknown: T(1 − 1/shots) and 2T(T − 1)(1 − 1/shots)/shots.
 * The total fixes the rest of the sum, so the variance is that of the pairs that share a shot; places being alike, it is
 * a multiple of T(T − 1)(M − T)(M − T − 1), and T = 2 gives the factor.
 *
 * @param total defects in the batch, 0 ≤ T ≤ M
 * @param shots in the batch, ≥ 2
 * @param trials N, or null when unknown
 * Source: Haldane 1937, Biometrika 29:133, for N unknown (m); both held against enumeration by the tests.
 */
export function equalSquares(
  total: number,
  shots: number,
  trials: number | null
): { mean: number; variance: number } {
  if (trials === null) {
    const apart = 1 - 1 / shots;
    return { mean: total * apart, variance: Math.max(0, (2 * total * (total - 1) * apart) / shots) };
  }
  const places = shots * trials;
  const empty = places - total;
  const shared = (trials - 1) / (places - 1);
  // Two places, or three, leave no choice of two pairs.
  const variance =
    places < 4
      ? 0
      : (2 * total * (total - 1) * empty * (empty - 1) * shared * (1 - shared)) /
        ((places - 2) * (places - 3));
  return {
    mean: ((shots - 1) * total * empty) / (shots * (places - 1)),
    variance: Math.max(0, variance)
  };
}
