import { normalQuantile } from '../numerics/normal-quantile';
import type { Interval } from '../types';

/** Shots in all that would decide, if the truth is what the data suggest; null when nothing suggests it. */
export interface Deciding {
  /** S times the relative variance of variance over ceiling; null where there is nothing to compare. */
  shape: number | null;
  shots: number;
  dispersion: Interval;
  tolerance: number;
  alpha: number;
  /** Tests among which α is shared. */
  tests: number;
}

/** Quantile of a one-sided normal test at 80 % power. */
const power = 0.842;

/**
 * Shots that would turn "undecided" into an answer in four of five repeats, if the variance stays where it is.
 *
 * - Compatible: as many as bring the upper 95 % limit under 1 + tolerance, (1.96 + 0.842)² · shape/(tolerance − excess)²,
 *   a variance at or below the ceiling counting as at it.
 * - Ruled out: as many as show the excess at α shared among all tests (Holm), (z(α/m) + 0.842)² · shape/excess².
 *
 * The nearer of the two. `shape`: see dispersionShape and keptShape.
 */
export function shotsToDecide(deciding: Deciding): number | null {
  const { shape, shots, dispersion, tolerance, alpha, tests } = deciding;
  if (shape === null || dispersion.value === null) return null;
  const excess = Math.max(0, dispersion.value - 1);
  const room = tolerance - excess;
  const compatible = room > 0 ? shape * ((1.96 + power) / room) ** 2 : Infinity;
  const ruledOut = excess > 0 ? shape * ((power - normalQuantile(alpha / tests)) / excess) ** 2 : Infinity;
  const needed = Math.max(fewest, Math.ceil(Math.min(compatible, ruledOut)));
  // Already more than that and still undecided: the estimate was lucky, and twice as many is the honest reply.
  return needed > shots ? needed : 2 * shots;
}

/** See answer: fewer are never called compatible. */
const fewest = 50;
