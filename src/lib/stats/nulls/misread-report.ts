import { ceiling } from '../bounds/ceiling';
import { chainBlocks } from '../misread/chain-blocks';
import { neededRate } from '../misread/needed-rate';
import { isReadChain } from '../misread/read-chain';
import { ringCeiling } from '../misread/ring-ceiling';
import { ringWindow } from '../misread/ring-window';
import { clampedVariance } from '../moments/clamped-variance';
import { largestRate } from '../misread/largest-rate';
import { lumpedCeiling } from '../moments/lumped-ceiling';
import type { RateSpread } from '../rate-interval/types';
import type { FittedLaw } from '../resampling/fitted-law';
import type { DiagnoseOptions, Diagnosis, Histogram, MisreadPart } from '../types';

/**
 * The `nuisances.misread` of the document: for single kinks on the bonds of an open chain or a ring of known length, what
 * misreads would need to be and, when a rate was stated and allowed for, the two ceilings side by side. undefined for other experiments.
 *
 * @param equal probability of equal trials of that mean
 */
export function misreadReport(
  options: DiagnoseOptions,
  { counts, lump, below }: Histogram,
  moments: Omit<Diagnosis['moments'], 'criticalTrials'>,
  equal: number,
  law: FittedLaw,
  shots: number,
  spread?: RateSpread
): MisreadPart | undefined {
  const { trials, geometry, unit, misread } = options;
  const ring = geometry === 'ring-bonds';
  if (geometry === 'sites' || unit === 'pair' || trials === null || trials < (ring ? 3 : 2)) return undefined;
  // No ring gives an odd count, whatever the rate.
  if (ring && counts.some(([n]) => n % 2 === 1)) return undefined;
  const mean = moments.mean.value!;
  const rawCeiling = ring
    ? ringRaw(mean, trials, { lump, below })
    : lump || below
      ? lumpedCeiling(trials, equal, { lump, below })
      : ceiling(mean, trials);
  const variance = moments.variance.value;
  const applied = isReadChain(law) && !law.kept;
  return {
    applied,
    rate: misread,
    ceiling: applied ? moments.ceiling : null,
    rawCeiling,
    rawDispersion: variance === null || !(rawCeiling > 0) ? null : variance / rawCeiling,
    // A lump hides how far its counts reach.
    neededRate:
      lump || below
        ? { value: null, low: null, high: null }
        : neededRate(mean, moments.variance, trials, ring),
    ...(lump || below ? {} : { largestRate: largestRate(mean, trials, shots, geometry) }),
    ...(spread && { spread }),
    kinks: applied && isReadChain(law) ? chainBlocks(law) : null
  };
}

/** Ceiling of independent kinks round a ring but for their even total, without misreads. */
function ringRaw(mean: number, bonds: number, rows: Pick<Histogram, 'lump' | 'below'>): number {
  const { variance, kinks: along } = ringCeiling(bonds, 0)(mean);
  if (!rows.lump && !rows.below) return variance;
  const blocks = Array.from(along!, (p) => ({ p, trials: 1 }));
  return clampedVariance(ringWindow(blocks, 0, 1), rows);
}
