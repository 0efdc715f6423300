import { stream } from '../resampling/streams';
import type { Diagnosis, Histogram, Interval } from '../types';
import { lumpedCeiling } from './lumped-ceiling';
import { momentIntervals, type MomentIntervals } from './moment-intervals';

/**
 * Moments of the document, without the critical N. A lump counts as the count of it nearest to the others, so that
 * the variance is then a lower limit (see lumpedLimits for what mean and variance can be), and the ceiling is the
 * variance of equal trials lumped in the same way: against the plain ceiling any lumped histogram would look regular
 * (the document's cautions say so). Third and fourth cumulant are then not known: they hang most on the
 * counts far from the mean, which are the hidden ones, so that no number is told.
 *
 * @param equal probability of the equal trials, or their mean when N is unknown
 * @param ceiling another ceiling than that of independent trials, or null
 */
export function momentReport(
  histogram: Histogram,
  trials: number | null,
  equal: number,
  options: { resamples: number; seed: number },
  ceiling: number | null = null
): Omit<Diagnosis['moments'], 'criticalTrials'> {
  const { lump, below = null } = histogram;
  const counts: [number, number][] = [
    ...(below ? [[below.to, below.shots] as [number, number]] : []),
    ...histogram.counts,
    ...(lump ? [[lump.from, lump.shots] as [number, number]] : [])
  ];
  const found = momentIntervals(counts, trials, { ...options, stream: stream('intervals', 0) });
  const lumped = lump !== null || below !== null;
  const other = ceiling ?? (lumped ? lumpedCeiling(trials, equal, { lump, below }) : null);
  if (other !== null) replaceCeiling(found, other);
  const variance = found.variance.value;
  return {
    ...found,
    ...(lumped && { third: { ...UNKNOWN }, fourth: { ...UNKNOWN } }),
    // Of lumped counts the difference bounds no covariance: their own variance and mean are not known.
    pairCovariance: variance === null || lumped ? null : variance - found.ceiling
  };
}

const UNKNOWN: Interval = { value: null, low: null, high: null };

/** Replaces the ceiling, and variance/ceiling with it. */
function replaceCeiling(found: MomentIntervals, other: number): void {
  const factor = found.ceiling / other;
  const scaled = (value: number | null) => (value === null ? null : value * factor);
  const { value, low, high } = found.dispersion;
  found.ceiling = other;
  found.dispersion = { value: scaled(value), low: scaled(low), high: scaled(high) };
}
