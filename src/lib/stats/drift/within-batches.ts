import { evenDispersionFactors } from '../moments/even-dispersion-factors';
import { chiSquareTail } from '../numerics/chi-square-tail';
import { generator } from '../random/generator';
import { stream } from '../resampling/streams';
import type { Interval } from '../types';
import type { BatchParts } from './batch-parts';
import type { SquaresLaw } from './squares-law';
import { strewnSquares } from './strewn-squares';
import type { BatchLine } from './types';

/** What the batches say one by one and pooled, before it is judged. */
export interface WithinBatches {
  dispersion: Interval;
  /** Sum over batches of what equal trials give, over the degrees of freedom: the ceiling within batches. */
  ceiling: number;
  /** Degrees of freedom, S − B. */
  freedom: number;
  /** Degrees of freedom of a chi-square that scatters as the pooled variance does; null where nothing is allowed. */
  shape: number | null;
  p: number | null;
  smallestP: number;
  source: 'resampled' | 'limit';
  resamples: number;
  lines: BatchLine[];
}

/**
 * Below this variance of Σ(n − mean)² (four times the pairs of defects that share a shot) the sum is too lumpy for
 * chi-square: 200 pairs, where its 1 % is 1.1 % to 1.3 %.
 */
const enough = 800;

/**
 * Variance within batches against equal trials, batch by batch and pooled: each batch at its own total, so that a rate
 * that differs from batch to batch leaves no trace.
 *
 * Σ over batches of Σ(n − mean_b)² has the mean and variance of `law` (exact for independent trials); p by chi-square
 * scaled to both. Where defects are few, p by strewing the defects over their batches, 999 times at most. Limits of
 * the dispersion by chi-square too, with the fewer degrees of freedom of what equal trials and what the shots themselves
 * give, so that shots which scatter more widely get wider limits.
 *
 * @param slope derivative of the ceiling by the mean, at the mean of all shots
 */
export function withinBatches(
  { batches, within, third, fourth, ratio }: BatchParts,
  law: SquaresLaw,
  slope: number,
  options: { resamples: number; seed: number }
): WithinBatches {
  let seen = 0;
  let allowed = 0;
  let spread = 0;
  const lines = batches.map(({ shots, mean, variance }, i): BatchLine => {
    const line = { batch: i + 1, shots, mean, dispersion: null, p: null };
    if (variance === null) return line;
    const squares = (shots - 1) * variance;
    const one = law.of(Math.round(mean * shots), shots);
    seen += squares;
    allowed += one.mean;
    spread += one.variance;
    return {
      ...line,
      dispersion: one.mean > 0 ? squares / one.mean : null,
      p: one.variance >= enough ? scaledTail(squares, one) : null
    };
  });
  const freedom = ratio.within;
  const base = { ceiling: allowed / freedom, freedom, lines };
  if (!(allowed > 0 && spread > 0)) {
    const none = { value: null, low: null, high: null };
    return { ...base, shape: null, dispersion: none, p: null, smallestP: 0, source: 'limit', resamples: 0 };
  }
  const value = seen / allowed;
  const scatter = (fourth - 2 * slope * third + slope * slope * seen) / (freedom * within * within) - 1;
  const even = (2 * allowed * allowed) / spread;
  const shape = Math.max(1, scatter > 0 ? Math.min(even, (2 * freedom) / scatter) : even);
  const { low, high } = evenDispersionFactors(shape + 1, null, 0.025);
  const dispersion = { value, low: value * low, high: value * high };
  if (spread >= enough || law.trials === undefined)
    return {
      ...base,
      shape,
      dispersion,
      p: spread >= enough ? scaledTail(seen, { mean: allowed, variance: spread }) : null,
      smallestP: 0,
      source: 'limit',
      resamples: 0
    };
  return { ...base, shape, dispersion, ...drawn(batches, seen, law.trials, options), source: 'resampled' };
}

/** P(X ≥ squares) for X with that mean and variance, as a multiple of chi-square. */
function scaledTail(squares: number, { mean, variance }: { mean: number; variance: number }): number {
  return chiSquareTail((2 * mean * squares) / variance, (2 * mean * mean) / variance);
}

/** p by strewing the defects of every batch anew. */
function drawn(
  batches: BatchParts['batches'],
  seen: number,
  trials: number | null,
  { resamples, seed }: { resamples: number; seed: number }
): { p: number; smallestP: number; resamples: number } {
  const whole = batches.filter(({ shots }) => shots > 1);
  const defects = whole.reduce((sum, { shots, mean }) => sum + mean * shots, 0);
  const draws = Math.min(resamples, 999, Math.max(99, Math.floor(5e6 / defects)));
  const buffer = new Float64Array(Math.max(...whole.map(({ shots }) => shots)));
  let reached = 0;
  for (let b = 0; b < draws; b++) {
    const random = generator(seed, stream('within batches', b));
    let sum = 0;
    for (const { shots, mean } of whole)
      sum += strewnSquares(random, Math.round(mean * shots), shots, trials, buffer);
    if (sum >= seen - 1e-9 * Math.max(1, seen)) reached++;
  }
  return { p: (reached + 1) / (draws + 1), smallestP: 1 / (draws + 1), resamples: draws };
}
