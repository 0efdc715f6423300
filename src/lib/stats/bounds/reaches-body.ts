/** Ends of an interval; null where it is open. */
export interface Ends {
  low: number | null;
  high: number | null;
}

/**
 * Whether any independent trials have κ2/κ1 and κ3/κ1 inside these two intervals: whether the rectangle meets the
 * region of `reachableThird`. Exact, by the roots of the two edges; both sets of κ2/κ1 below are intervals, since the
 * lower edge is convex and the upper concave.
 *
 * @param fano interval of κ2/κ1
 * @param third interval of κ3/κ1
 * @param share μ/N, 0 when N is unknown
 */
export function reachesBody(fano: Ends, third: Ends, share: number): boolean {
  let from = Math.max(0, fano.low ?? 0);
  let to = Math.min(1 - share, fano.high ?? Infinity);
  if (third.high !== null) {
    // F(2F − 1) ≤ t
    if (third.high < -1 / 8) return false;
    const root = Math.sqrt(1 + 8 * third.high);
    from = Math.max(from, (1 - root) / 4);
    to = Math.min(to, (1 + root) / 4);
  }
  if (third.low !== null) {
    // F − a F² ≥ t, a = 2m/(1 − m); the lower root as 2t/(1 + √…), which holds for a = 0 too.
    const a = (2 * share) / (1 - share);
    const discriminant = 1 - 4 * a * third.low;
    if (discriminant < 0) return false;
    const root = Math.sqrt(discriminant);
    from = Math.max(from, (2 * third.low) / (1 + root));
    if (a > 0) to = Math.min(to, (1 + root) / (2 * a));
  }
  return from <= to;
}
