import { stream } from '../resampling/streams';
import type { Diagnosis, Histogram } from '../types';
import { momentIntervals } from './moment-intervals';

/**
 * Moments of the document, without the critical N. A lump counts as its first count, so that mean and variance
 * are then lower limits (the document's cautions say so).
 */
export function momentReport(
  histogram: Histogram,
  trials: number | null,
  options: { resamples: number; seed: number }
): Omit<Diagnosis['moments'], 'criticalTrials'> {
  const { lump } = histogram;
  const counts = lump ? [...histogram.counts, [lump.from, lump.shots] as [number, number]] : histogram.counts;
  const found = momentIntervals(counts, trials, { ...options, stream: stream('intervals', 0) });
  const variance = found.variance.value;
  return { ...found, pairCovariance: variance === null ? null : variance - found.ceiling };
}
