import { lawMoments } from '../laws/law-moments';
import { lawRate } from '../laws/law-rate';
import { lawWindow } from '../laws/law-window';
import { clopperPearson } from '../numerics/clopper-pearson';
import type { Histogram, Law } from '../types';

/** Odds of a shot with few defects. */
export interface LuckyShot {
  /** P(X ≤ most) under the law. */
  exact: number;
  /** Chernoff's bound on it, exp(−rate); 1 from the mean up. */
  chernoff: number;
  /** Shots until the first one, on average, 1/P; null when the law forbids it. */
  shotsUntil: number | null;
  /** Share of the shots seen with at most as many, with its exact 95 % interval; null when a lump hides it. */
  observed: { shots: number; share: number; low: number; high: number } | null;
}

/**
 * Odds that a shot has at most `most` defects: exactly under a law, by Chernoff's bound, and as seen.
 *
 * @param law as a rule the best law of the histogram
 * @param most a whole number ≥ 0
 * The sum of the pmf is one of positive terms, smallest first: relative error about 1e-13 down to 1e-300.
 * Source of the bound: Chernoff 1952.
 */
export function luckyShot(law: Law, histogram: Histogram, most: number): LuckyShot {
  const { first, values, scale } = lawWindow(law);
  let exact = 0;
  for (let k = 0; k < values.length && first + k <= most; k++) exact += values[k] / scale;
  exact = Math.min(1, exact);
  const { mean } = lawMoments(law);
  const chernoff = most >= mean ? 1 : Math.exp(-lawRate(law, most));
  const rows = histogram.counts.filter(([count]) => count <= most);
  const shots = rows.reduce((sum, [, seen]) => sum + seen, 0);
  const total = histogram.counts.reduce((sum, [, seen]) => sum + seen, histogram.lump?.shots ?? 0);
  const hidden = histogram.lump !== null && most >= histogram.lump.from;
  return {
    exact,
    chernoff,
    shotsUntil: exact > 0 ? 1 / exact : null,
    observed: hidden || total === 0 ? null : { shots, share: shots / total, ...clopperPearson(shots, total) }
  };
}
