import { ceiling } from '../bounds/ceiling';
import { chainBlocks } from '../misread/chain-blocks';
import { neededRate } from '../misread/needed-rate';
import { isReadChain } from '../misread/read-chain';
import { largestRate } from '../misread/largest-rate';
import { lumpedCeiling } from '../moments/lumped-ceiling';
import type { RateSpread } from '../rate-interval/types';
import type { FittedLaw } from '../resampling/fitted-law';
import type { DiagnoseOptions, Diagnosis, Histogram, MisreadPart } from '../types';

/**
 * The `nuisances.misread` of the document: for kinks on the bonds of an open chain of known length, what misreads would need to
 * be and, when a rate was stated and allowed for, the two ceilings side by side. undefined for other experiments.
 *
 * @param equal probability of equal trials of that mean
 */
export function misreadReport(
  options: DiagnoseOptions,
  { lump, below }: Histogram,
  moments: Omit<Diagnosis['moments'], 'criticalTrials'>,
  equal: number,
  law: FittedLaw,
  shots: number,
  spread?: RateSpread
): MisreadPart | undefined {
  const { trials, geometry, unit, misread } = options;
  if (geometry !== 'open-bonds' || unit !== 'defect' || trials === null || trials < 2) return undefined;
  const mean = moments.mean.value!;
  const rawCeiling = lump || below ? lumpedCeiling(trials, equal, { lump, below }) : ceiling(mean, trials);
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
      lump || below ? { value: null, low: null, high: null } : neededRate(mean, moments.variance, trials),
    ...(lump || below ? {} : { largestRate: largestRate(mean, trials, shots, geometry) }),
    ...(spread && { spread }),
    kinks: applied && isReadChain(law) ? chainBlocks(law) : null
  };
}
