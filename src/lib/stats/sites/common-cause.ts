import { logNormalTail } from '../numerics/log-normal-tail';
import type { PairTest } from './pair-tests';

/** Whether sites move together as a whole. */
export interface CommonCause {
  /** Pairs it rests on: distant ones; those that were found are set aside, unless they are more than half. */
  pairs: number;
  mean: number | null;
  /** Of them, the share with a correlation above 0. */
  positive: number | null;
  /** Two-sided. */
  p: number | null;
  /** The mean is not that of independent sites: above 0 all move together, below it they avoid each other. */
  shown: boolean;
}

/** Level of the warning. Common practice. */
const level = 0.01;

/**
 * Tests the mean correlation of the pairs against 0. With each site's shots shuffled by themselves a phi coefficient has
 * mean 0 and variance 1/(S − 1) exactly, and those of two pairs are uncorrelated, so the mean of m has variance
 * 1/(m(S − 1)); its law is taken as normal. Drifting rates and dead shots move all pairs alike, however far apart, while
 * coupled neighbours move those near by: only pairs further apart than a quarter of the largest distance count, which is
 * fixed by the geometry, and of these not the ones that were found.
 */
export function commonCause(pairs: PairTest[], shots: number, alpha: number): CommonCause {
  const furthest = pairs.reduce((most, { distance }) => Math.max(most, distance), 1);
  const known = pairs.flatMap(({ correlation, pHolm, distance }) =>
    correlation === null || distance <= furthest / 4 || (furthest > 1 && distance === 1)
      ? []
      : [{ correlation, pHolm }]
  );
  const rest = known.filter(({ pHolm }) => pHolm > alpha);
  const used = rest.length < known.length / 2 ? known : rest;
  if (used.length < 3 || shots < 3)
    return { pairs: used.length, mean: null, positive: null, p: null, shown: false };
  const mean = used.reduce((sum, { correlation }) => sum + correlation, 0) / used.length;
  const p = Math.min(1, 2 * Math.exp(logNormalTail(Math.abs(mean) * Math.sqrt(used.length * (shots - 1)))));
  const positive = used.filter(({ correlation }) => correlation > 0).length / used.length;
  return { pairs: used.length, mean, positive, p, shown: p <= level };
}
