/** Least and greatest value that a moment can have, given the ones below it. */
export interface MomentLimits {
  low: number;
  high: number;
}

/**
 * Limits of the moments of a measure on [0, `end`], order by order: of ∫x, ∫x², ∫x³ and ∫x⁴ given those before.
 *
 * @param moments ∫x^r for r = 0, 1, …, at most five; the zeroth may be Infinity (mass unbounded)
 * @param end right end of the interval, or Infinity
 * @returns one pair for each order from 1, NaN or ±Infinity where the moments before it are already impossible
 *
 * By the Hankel determinants, each solved for its highest moment:
 *   m1 ≤ e·m0;  m1²/m0 ≤ m2 ≤ e·m1;  m2²/m1 ≤ m3 ≤ e·m2 − (e·m1 − m2)²/(e·m0 − m1);
 *   (m0 m3² − 2 m1 m2 m3 + m2³)/(m0 m2 − m1²) ≤ m4 ≤ e·m3 − (e·m2 − m3)²/(e·m1 − m2).
 * Source: the truncated Hausdorff moment problem (Shohat & Tamarkin 1943, The Problem of Moments, m).
 */
export function momentLimits(moments: number[], end: number): MomentLimits[] {
  const [m0, m1, m2, m3] = moments;
  const open = end === Infinity;
  const free = m0 === Infinity;
  const limits: (() => MomentLimits)[] = [
    () => ({ low: 0, high: open || free ? Infinity : end * m0 }),
    () => ({ low: free ? 0 : m1 * (m1 / m0), high: open ? Infinity : end * m1 }),
    () => ({
      low: part([m2, 0], [m1, 0]),
      high: open ? Infinity : end * m2 - (free ? 0 : part([end * m1, m2], [end * m0, m1]))
    }),
    () => ({
      low: free ? part([m3, 0], [m2, 0]) : m2 * (m2 / m0) + part([m0 * m3, m1 * m2], [m0 * m2, m1 * m1]) / m0,
      high: open ? Infinity : end * m3 - part([end * m2, m3], [end * m1, m2])
    })
  ];
  return limits.slice(0, moments.length - 1).map((limit) => limit());
}

/**
 * (a − b)²/(c − d). 0/0 asks for nothing, anything else over nothing cannot be met; both up to the rounding of the
 * terms, for laws of one and of two points lie there.
 */
function part([a, b]: [number, number], [c, d]: [number, number]): number {
  const [root, minor] = [a - b, c - d];
  if (minor > 1e-13 * (Math.abs(c) + Math.abs(d))) return root * (root / minor);
  return Math.abs(root) <= 1e-12 * (Math.abs(a) + Math.abs(b)) &&
    Math.abs(minor) <= 1e-13 * (Math.abs(c) + Math.abs(d))
    ? 0
    : Infinity;
}
