/**
 * Misread rate ε of a site that gives independent kinks on an open chain of N bonds the mean and variance
 * seen: with m = 1−2p, u = 1−2ε, mean = N(1 − m u²)/2 and variance = ¼[N(1 − m²u⁴) + 2(N−1)m²u²(1−u²)].
 *
 * @returns ε in (0, ½), or null when the variance is not above the ceiling or no ε reaches it
 * The mean fixes m u² = 1 − 2·mean/N =: c, so variance = ¼[N(1−c²) + 2(N−1)c²(1/u² − 1)] and u² follows.
 */
export function misreadNeeded(mean: number, variance: number, bonds: number): number | null {
  const c = 1 - (2 * mean) / bonds;
  if (bonds < 2 || !(c > 0)) return null;
  const excess = 4 * variance - bonds * (1 - c * c);
  if (!(excess > 0)) return null;
  const square = 1 / (1 + excess / (2 * (bonds - 1) * c * c));
  // p ≥ 0 needs m = c/u² ≤ 1.
  return square < c ? null : (1 - Math.sqrt(square)) / 2;
}
