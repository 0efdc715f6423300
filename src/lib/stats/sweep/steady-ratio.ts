import { chiSquareTail } from '../numerics/chi-square-tail';

/** One value behind several measured ones. */
export interface SteadyRatio {
  value: number;
  error: number;
  chiSquare: number;
  freedom: number;
  /** P(scatter at least this large) where the value is the same everywhere; null for one value. */
  p: number | null;
}

/**
 * The ratio R of two measured quantities that is the same in every dataset, y = R x, both with errors: the root of
 * Σ x (y − R x) / Var(y − R x), the variance taken at R itself. Ratios are not averaged: their mean leans by the errors
 * of what they are divided by.
 *
 * @param pairs x, y and their variances and covariance
 * @returns null where an x is not positive or nothing has an error
 *
 * Source: Fieller 1954, J. R. Stat. Soc. B 16:175, for one pair; over several as weighted least squares, weights iterated.
 */
export function steadyRatio(
  pairs: { x: number; y: number; varX: number; varY: number; covariance: number }[]
): SteadyRatio | null {
  if (pairs.length === 0 || !pairs.every(({ x }) => x > 0)) return null;
  const spreadAt = (r: number) =>
    pairs.map(({ varX, varY, covariance }) => varY - 2 * r * covariance + r * r * varX);
  let value = pairs.reduce((sum, { y }) => sum + y, 0) / pairs.reduce((sum, { x }) => sum + x, 0);
  for (let step = 0; step < 50; step++) {
    const spread = spreadAt(value);
    if (!spread.every((one) => one > 0)) return null;
    const next =
      pairs.reduce((sum, { x, y }, i) => sum + (x * y) / spread[i], 0) /
      pairs.reduce((sum, { x }, i) => sum + (x * x) / spread[i], 0);
    const moved = Math.abs(next - value);
    value = next;
    if (moved <= 1e-14 * Math.abs(value)) break;
  }
  const spread = spreadAt(value);
  const chiSquare = pairs.reduce((sum, { x, y }, i) => sum + (y - value * x) ** 2 / spread[i], 0);
  const freedom = pairs.length - 1;
  return {
    value,
    error: 1 / Math.sqrt(pairs.reduce((sum, { x }, i) => sum + (x * x) / spread[i], 0)),
    chiSquare,
    freedom,
    p: freedom > 0 ? chiSquareTail(chiSquare, freedom) : null
  };
}
