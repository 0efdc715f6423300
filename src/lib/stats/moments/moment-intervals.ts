import type { Interval } from '../types';
import { evenDispersionFactors } from './even-dispersion-factors';
import { kStatistics } from './k-statistics';
import { meanLimits } from './mean-limits';
import { MOMENT_NAMES } from './moment-values';
import { resampledLimits } from './resampled-limits';
import { unseenRange } from './unseen-range';

export interface MomentIntervalOptions {
  resamples: number;
  seed: number;
  /** Stream of random numbers to use; 0 by default. */
  stream?: number;
  /** Coverage aimed at; 0.95 by default. */
  level?: number;
}

type Named = Record<(typeof MOMENT_NAMES)[number], Interval>;

export interface MomentIntervals {
  mean: Interval;
  variance: Interval;
  third: Interval;
  fourth: Interval;
  fano: Interval;
  ceiling: number;
  dispersion: Interval;
}

/**
 * Mean, variance, third and fourth cumulant (k-statistics), variance/mean ("fano") and unbiased variance/ceiling
 * ("dispersion", ceiling = mean (1 − mean/N), N unknown: mean), each with an interval.
 *
 * Limits are bootstrap-t from seeded multinomial resamples of the histogram; for variance, fano and dispersion the
 * widest of that, Fisher's index of dispersion and what one unseen count could add. Share of misses in percent, low
 * limit above/high limit below the truth, 2.5/2.5 wanted (2000 histograms, 999 resamples each):
 *
 * | law, shots | mean | variance | third | fourth | dispersion |
 * |---|---|---|---|---|---|
 * | Bin(12, 0.3), 40 / 300 / 3000 | 2.0/2.8, 2.5/2.7, 2.8/2.6 | 1.9/1.4, 2.1/1.6, 2.1/2.6 | 1.6/11, 2.1/5.3, 2.1/3.6 | 4.0/7.2, 1.9/8.3, 2.5/4.0 | 1.9/1.0, 2.4/1.6, 2.4/2.6 |
 * | Poisson(0.5) | 1.9/2.0, 2.8/2.9, 2.6/2.7 | 0.9/2.3, 2.3/1.2, 2.1/2.0 | 0.6/8.2, 2.0/4.6, 2.3/2.9 | 1.8/30, 0.9/6.3, 1.9/4.6 | 0.9/0.7, 2.4/0.9, 2.2/1.9 |
 * | 12 spread p, 0.05 … 0.9 | 2.3/2.8, 2.8/2.9, 2.5/2.6 | 1.6/1.2, 2.1/1.6, 2.3/2.3 | 2.6/8.7, 3.1/5.5, 2.1/3.8 | 3.3/8.7, 2.2/7.3, 2.6/4.7 | 2.0/0.8, 2.1/1.4, 2.3/2.4 |
 * | beta-binomial, N = 64, dispersion 1.1 | 2.7/2.5, 2.7/2.3, 3.0/2.1 | 1.4/1.9, 2.5/2.2, 2.4/2.8 | 1.8/13, 2.4/6.2, 2.4/3.1 | 3.0/11, 1.9/11, 2.4/5.4 | 1.4/1.9, 2.3/2.1, 2.8/3.0 |
 *
 * The high end of dispersion, which decides the answer, misses at most 3.0 % there and for negative binomial,
 * Poisson(0.05) and rare-pair counts; a BCa bootstrap misses 4.4, 6.0, 4.0 and 3.6 % of the four laws at 40 shots
 * and 9.4 % of negative binomial ones. What no interval can cover is rare far bursts: 0.4 % of shots at thrice the
 * mean are missed in 6.6 % of 300-shot histograms. Do not lean on third and fourth below 1000 shots.
 *
 * @param counts `[count, shots]` without a lump; rows with no shots change nothing
 * @param trials N, or null when unknown
 * @param options resamples (1999 give limits to 3 % of the half width; fewer than 39 give none of their own), seed
 * @returns null where not defined: variance of one shot, third of two, fourth of three, fano at mean 0, dispersion
 *   at mean 0 or N. `low` and `high` are null when all shots have one count, and where the data set no limit
 * @throws RangeError for no shots, fractions, or counts outside 0 … N
 *
 * Source: Efron & Tibshirani 1993, An Introduction to the Bootstrap, ch. 12.5 and 14.3.
 */
export function momentIntervals(
  counts: readonly (readonly [number, number])[],
  trials: number | null,
  { resamples, seed, stream = 0, level = 0.95 }: MomentIntervalOptions
): MomentIntervals {
  const seen = counts.filter(([, h]) => h !== 0).sort((a, b) => a[0] - b[0]);
  const { shots, mean, variance, third, fourth } = kStatistics(seen);
  const most = seen[seen.length - 1][0];
  if (seen[0][0] < 0 || (trials !== null && most > trials)) {
    throw new RangeError(`count outside 0 … ${trials ?? '∞'}`);
  }

  const ceiling = trials === null ? mean : mean === 0 ? 0 : mean * (1 - mean / trials);
  const over = (divisor: number) => (variance === null || divisor === 0 ? null : variance / divisor);
  const values = [mean, variance, third, fourth, over(mean), over(ceiling)];
  const intervals = values.map((value): Interval => ({ value, low: null, high: null }));
  const named = Object.fromEntries(MOMENT_NAMES.map((name, j) => [name, intervals[j]])) as Named;
  if (seen.length > 1) {
    const tail = (1 - level) / 2;
    const limits = resampledLimits(seen, trials, { resamples, seed, stream, tail });
    limits.forEach(([low, high], j) => {
      if (values[j] !== null && Number.isFinite(low)) intervals[j].low = low;
      if (values[j] !== null && Number.isFinite(high)) intervals[j].high = high;
    });
    const exact = meanLimits(Math.round(mean * shots), shots, trials, level);
    named.mean.low = Math.max(0, named.mean.low ?? exact.low);
    named.mean.high = Math.min(trials ?? Infinity, named.mean.high ?? exact.high);
    if (trials === 1) {
      // One trial: variance/ceiling is S/(S − 1) whatever the data, and says nothing.
      named.dispersion.low = named.dispersion.high = null;
    } else {
      const even = evenDispersionFactors(shots, trials, tail);
      const { least, largest } = unseenRange(seen, mean, variance!, trials, tail);
      for (const name of ['variance', 'fano', 'dispersion'] as const) {
        const interval = named[name];
        interval.low = Math.max(0, Math.min(interval.low ?? 0, interval.value! * even.low, least[name]));
        interval.high = Math.max(interval.high ?? 0, interval.value! * even.high, largest[name]);
      }
      // No law on 0 … N scatters more than N times the ceiling, though an unbiased estimate may.
      if (trials !== null) {
        const { value, high } = named.dispersion;
        named.dispersion.high = Math.max(value!, Math.min(trials, high!));
      }
    }
  }
  return { ...named, ceiling };
}
