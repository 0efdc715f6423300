import type { Effect } from './effect';

/**
 * Size that an effect must stay below on counts of this mean, or 0 where the effect cannot be.
 *
 * excess: N − 1, every site alike in a shot (100 with N unknown, twice as long to see as 1). pairs: 1. neighbours:
 * 0.98, as in its story. misread: the ε whose toggles alone, N·2ε(1 − ε), make the mean, and below ½.
 */
export function largestEffect({ kind, mean, trials }: Omit<Effect, 'size'>): number {
  if (kind === 'excess') return trials === null ? 100 : trials - 1;
  if (trials === null || trials < 2) return 0;
  if (kind === 'pairs') return 1;
  if (kind === 'neighbours') return 0.98;
  // 2ε(1 − ε) = μ/N; from μ = N/2 on misreads alone never make the mean.
  const share = (2 * mean) / trials;
  return share >= 1 ? 0.5 : (1 - Math.sqrt(1 - share)) / 2;
}
