import { certificate } from '../bounds/certificate';
import { bestLaw } from '../fit/best-law';
import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { toLaw } from '../fit/trial-levels';
import { fitReport } from '../fit-report/fit-report';
import { floorLaw } from '../floor/floor-law';
import { lawMoments } from '../laws/law-moments';
import { equalWindow } from '../resampling/ceiling-test';
import type { DiagnoseOptions, Histogram } from '../types';
import { meanBounds } from './mean-bounds';
import type { NullLaw } from './null-law';

/**
 * Independent trials: the best law, its floor, the exact certificate, Hoeffding's and Chernoff's bounds.
 *
 * @param equal probability of the equal trials, or their mean when N is unknown
 * @param onFloor called between fit and floor, which both take their time
 */
export async function independentNull(
  counts: FitData,
  histogram: Histogram,
  equal: number,
  options: DiagnoseOptions,
  onFloor: () => Promise<void>
): Promise<NullLaw> {
  const { trials } = counts;
  const best = bestLaw(counts);
  const law = toLaw(best.levels);
  await onFloor();
  const floor = floorLaw(counts);
  return {
    levels: best.levels,
    law,
    logLikelihood: best.logLikelihood,
    ceiling: null,
    mostDispersed: equalWindow(trials, equal),
    certificate: certificate({
      counts: histogram.counts,
      lump: histogram.lump,
      below: histogram.below ?? null,
      shots: counts.total,
      trials
    }),
    // The law's mean is that of the counts but for the rounding of the fit, up to 3e-5 of a far bound.
    bounds: meanBounds(
      counts.lump || counts.below ? lawMoments(law).mean : sampleMoments(counts).mean,
      trials
    ),
    report: (fitted) =>
      fitReport({ counts, best, law, floor, fitted, supplied: options.supplied, alpha: options.alpha })
  };
}
