import { lawMoments } from '../laws/law-moments';
import { lawRate } from '../laws/law-rate';
import { logTail } from '../laws/log-tail';
import { clopperPearson } from '../numerics/clopper-pearson';
import type { Histogram, Law } from '../types';

/** Smaller probabilities lose their digits, and their inverse its place. */
const least = 1e-307;

/** Odds of a shot with few defects. */
export interface LuckyShot {
  /** P(X ≤ most) under the law. */
  exact: number;
  /** Chernoff's bound on it, exp(−rate); 1 from the mean up. */
  chernoff: number;
  /** Shots until the first one, on average, 1/P; Infinity from 1e307 on, null when the law forbids it. */
  shotsUntil: number | null;
  /** Share of the shots seen with at most as many, with its exact 95 % interval; null when a lump hides it
   *  or no histogram is given. */
  observed: { shots: number; share: number; low: number; high: number } | null;
}

/**
 * Odds that a shot has at most `most` defects: exactly under a law, by Chernoff's bound, and as seen.
 *
 * @param law as a rule the best law of the histogram; without one, equal trials of a mean, which no independent trials
 *   of that mean pass for most ≤ mean − 1 (Hoeffding 1956)
 * @param most a whole number ≥ 0
 * Relative error under 1e-11 down to 1e-300, as `logTail`.
 * Source of the bound: Chernoff 1952.
 */
export function luckyShot(law: Law, histogram: Histogram | null, most: number): LuckyShot {
  const exact = Math.exp(logTail(law, 'low', most));
  const { mean } = lawMoments(law);
  const rate = most >= mean ? 0 : lawRate(law, most);
  return {
    exact,
    chernoff: Math.exp(-rate),
    shotsUntil: exact >= least ? 1 / exact : rate < Infinity ? Infinity : null,
    observed: histogram && shareSeen(histogram, most)
  };
}

function shareSeen({ counts, lump, below }: Histogram, most: number): LuckyShot['observed'] {
  const few = below?.shots ?? 0;
  const shots = counts.reduce((sum, [count, seen]) => sum + (count <= most ? seen : 0), few);
  const total = counts.reduce((sum, [, seen]) => sum + seen, few + (lump?.shots ?? 0));
  if (total === 0 || (below && most < below.to) || (lump !== null && most >= lump.from)) return null;
  return { shots, share: shots / total, ...clopperPearson(shots, total) };
}
