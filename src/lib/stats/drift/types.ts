import type { Interval } from '../types';
import type { MeanPoint } from './running-mean';

/** One batch: batches are numbered from 1 in the order in which they first come, since their names can name people. */
export interface BatchLine {
  batch: number;
  shots: number;
  mean: number;
  /** Variance over the ceiling at the batch's own mean; null where that says nothing. */
  dispersion: number | null;
  /** Under equal trials; null where the batch has too few defects to be tested by itself. */
  p: number | null;
}

/** Whether the rate moved inside batches too, by neighbouring shots of the same batch. */
export interface BatchOrder {
  /** Correlation of a shot with the next of its batch. */
  correlation: number;
  /** Chance of so large a one if the shots of every batch had come in any order. */
  p: number;
  /** Half the mean square difference of neighbours over the ceiling within batches: an excess with slow changes taken out. */
  dispersion: Interval;
  /** p at or under 5 %. */
  moved: boolean;
}

/** Batches one by one and pooled: what lies within them and what lies between them. */
export interface BatchSplit {
  batches: number;
  /** Pooled variance within batches over their ceilings, Σ(n − mean_b)² over what equal trials give. */
  dispersion: Interval;
  /** Variance over the ceiling within batches, and that of the means of the batches, in counts². They add up to `excess`. */
  excessWithin: Interval;
  excessBetween: number;
  /** Variance of all shots less its ceiling. */
  excess: number;
  /** Variance of the true means of the batches, with limits. */
  meansVariance: Interval;
  /** Pooled test of the variance within batches; null where it says nothing. */
  p: number | null;
  /** Smallest p that the pooled test could have shown; 0 for the limit law. */
  smallestP: number;
  source: 'resampled' | 'limit';
  resamples: number;
  /** Batches large enough to be tested by themselves, and the most telling of them. */
  tested: number;
  worst: BatchLine | null;
  /** Pooled and one by one together, allowed for: min(1, 2·min(p, tested·p of the worst)). */
  pTogether: number | null;
  /** null with too few neighbouring shots; absent in documents of engines before it. */
  order?: BatchOrder | null;
  verdict: 'compatible' | 'excess' | 'undecided';
  /** Every batch, where there are at most 200. */
  each: BatchLine[];
}

/** The most supported change of the mean. */
export interface ChangeLine {
  /** The first shot after the change, counted from 1. */
  shot: number;
  before: number;
  after: number;
  p: number;
  smallestP: number;
  source: 'permuted' | 'limit';
  resamples: number;
}

/** The order of the shots: means over time, the change best supported, and the excess split by batch. */
export interface DriftPart {
  /** Means of stretches of shots with three-sigma limits; empty with too few shots. */
  means: MeanPoint[];
  change: ChangeLine | null;
  split: BatchSplit | null;
  /** What batches say of the excess, or why they say nothing. */
  statement: string;
}
