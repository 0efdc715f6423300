import type { BestLaw } from '../fit/best-law';
import type { FitData } from '../fit/fit-data';
import type { FloorLaw } from '../floor/floor-law';
import { logPmf } from '../laws/log-pmf';
import { lawWindow } from '../laws/law-window';
import { referenceLaws } from '../references/reference-laws';
import { cells } from '../resampling/cells';
import { divergence } from '../resampling/divergence';
import type { FittedTests } from '../resampling/fitted-tests';
import type { Diagnosis, Law } from '../types';
import { divergenceInterval } from './divergence-interval';
import { howFound } from './how-found';

export interface FitReportInput {
  counts: FitData;
  best: BestLaw;
  law: Law;
  floor: FloorLaw;
  fitted: FittedTests;
  supplied: number[] | null;
  alpha: number;
}

/** The `fit` part of the document. About ln(1/α)/D shots make a divergence of D noticeable at level α. */
export function fitReport({
  counts,
  best,
  law,
  floor,
  fitted,
  supplied,
  alpha
}: FitReportInput): Diagnosis['fit'] {
  const plugIn = divergence(counts, best.logLikelihood);
  const laid = cells(counts, lawWindow(law, 1e-25, 1));
  const logLaw = Float64Array.from(laid.law, (f, i) =>
    f > 1e-20 ? Math.log(f) : logPmf(law, counts.first + i)
  );
  // The nearest count of a lump so far out is nearly all of it.
  const logLump = (probability: number, nearest: number | undefined) =>
    probability > 1e-20 || nearest === undefined ? Math.log(probability) : logPmf(law, nearest);
  const above = logLump(laid.above, counts.lump?.from);
  const below = logLump(laid.below, counts.below?.to);
  const corrected =
    fitted.nullDivergences.length > 0
      ? divergenceInterval(counts, logLaw, above, plugIn, fitted.nullDivergences, below)
      : null;
  // Where the interval reaches 0 there may be no difference to notice, at any number of shots.
  const noticed = corrected?.interval.low ? Math.ceil(Math.log(1 / alpha) / corrected.corrected) : null;
  return {
    logLikelihood: best.logLikelihood,
    levels: law.levels,
    poissonPart: law.poissonPart,
    divergence: plugIn,
    floor: Math.min(floor.divergence, plugIn),
    divergenceCorrected: corrected?.corrected ?? null,
    divergenceInterval: corrected?.interval ?? { value: null, low: null, high: null },
    gSquared: 2 * counts.total * plugIn,
    shotsToNotice: noticed,
    ...howFound(best, plugIn, floor.divergence, counts.total),
    ...referenceLaws(counts, supplied)
  };
}
