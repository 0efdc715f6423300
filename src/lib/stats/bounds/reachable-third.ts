/**
 * Lowest and highest κ3/κ1 that independent trials can have with this κ2/κ1: the edges of the moment body in the plane
 * of the two ratios, which are plain curves.
 *
 * With F = κ2/κ1 and m = μ/N: F(2F − 1) ≤ κ3/κ1 ≤ F − 2F² m/(1 − m), for 0 ≤ F ≤ 1 − m. The lower edge is reached by
 * equal trials of p = 1 − F, the others at 0; the upper by some trials at 1 and all others alike (N unknown: a Poisson
 * part and trials at 1). They meet at F = 0, every trial at 0 or 1, and at equal trials of p = m.
 *
 * @param fano F = κ2/κ1
 * @param share m = μ/N, 0 ≤ m < 1; 0 when N is unknown or unbounded
 * @returns null where no independent trials have this κ2/κ1. Laws of whole trials may stop short of an edge, since the
 *   moment body asks for a measure of mass N and not for whole trials: outside is impossible, inside may be.
 *
 * Source: the truncated Hausdorff moment problem (Shohat & Tamarkin 1943); the same limits as `momentBody`.
 */
export function reachableThird(fano: number, share: number): { low: number; high: number } | null {
  // 1e-12: the corner itself, 1 − μ/N, is reached and rounds either way.
  if (!(fano >= 0 && fano <= 1 - share + 1e-12)) return null;
  const low = fano * (2 * fano - 1);
  return { low, high: Math.max(low, fano * (1 - (2 * fano * share) / (1 - share))) };
}
