import { chiSquareTail } from '../numerics/chi-square-tail';
import { fitPowerLaws, type PowerLaws, type SweepPoint } from './fit-power-laws';
import { weighPoints } from './weigh-points';

/** Whether one exponent serves all quantities of a sweep. */
export interface CommonExponent {
  /** How many quantities from the first on could be fitted. */
  quantities: number;
  /** Each with an exponent of its own. */
  free: PowerLaws;
  /** All with one. */
  tied: PowerLaws;
  /** χ² that one exponent costs. */
  chiSquare: number;
  /** Exponents saved. */
  freedom: number;
  /** P(a cost at least this large) where one exponent is the truth. */
  p: number;
}

/**
 * Test of one exponent for all quantities against one each: the difference of the two χ² of generalised least squares.
 * Where the last quantity is too poorly known for a power law of its own (third cumulants of 500 Landau–Zener shots,
 * one sweep of seven), the others are tested without it.
 *
 * @param weighed the same points as weighPoints gives them, where the caller has them
 * @returns null where not even two quantities can be fitted
 *
 * Source: likelihood ratio of nested least squares with known covariances; Seber & Lee 2003, Linear Regression Analysis,
 * ch. 4 (m). Simulated false alarms at 5 %: tests/unit/stats/sweep.
 */
export function commonExponent(points: SweepPoint[], weighed = weighPoints(points)): CommonExponent | null {
  for (const { quantities, points: some, weights } of weighed) {
    const free = fitPowerLaws(some, false, weights);
    const tied = free && fitPowerLaws(some, true, weights);
    if (!free || !tied) continue;
    // Rounding of two minimisations may leave a difference of −1e-13.
    const chiSquare = Math.max(0, tied.chiSquare - free.chiSquare);
    const freedom = quantities - 1;
    return { quantities, free, tied, chiSquare, freedom, p: chiSquareTail(chiSquare, freedom) };
  }
  return null;
}
