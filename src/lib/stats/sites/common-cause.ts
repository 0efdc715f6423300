import { logNormalTail } from '../numerics/log-normal-tail';
import type { PairTest } from './pair-tests';

/** Whether sites move together as a whole. */
export interface CommonCause {
  /** Pairs it rests on: those that were found are set aside, unless they are more than a tenth of all. */
  pairs: number;
  mean: number | null;
  /** Of them, the share with a correlation above 0. */
  positive: number | null;
  /** Two-sided. */
  p: number | null;
  shown: boolean;
}

/** Level of the warning. Common practice. */
const level = 0.01;

/**
 * Tests the mean correlation of the pairs against 0. With each site's shots shuffled by themselves a phi coefficient has
 * mean 0 and variance 1/(S − 1) exactly, and those of two pairs are uncorrelated, so the mean of m has variance
 * 1/(m(S − 1)); its law is taken as normal. Drifting rates and dead shots move all pairs alike and show here, while
 * a few pairs that were found do not.
 */
export function commonCause(pairs: PairTest[], shots: number, alpha: number): CommonCause {
  const known = pairs.flatMap(({ correlation, pHolm }) =>
    correlation === null ? [] : [{ correlation, pHolm }]
  );
  const rest = known.filter(({ pHolm }) => pHolm > alpha);
  const used = known.length - rest.length > known.length / 10 ? known : rest;
  if (used.length < 3 || shots < 3)
    return { pairs: used.length, mean: null, positive: null, p: null, shown: false };
  const mean = used.reduce((sum, { correlation }) => sum + correlation, 0) / used.length;
  const p = Math.min(1, 2 * Math.exp(logNormalTail(Math.abs(mean) * Math.sqrt(used.length * (shots - 1)))));
  const positive = used.filter(({ correlation }) => correlation > 0).length / used.length;
  return { pairs: used.length, mean, positive, p, shown: p <= level };
}
