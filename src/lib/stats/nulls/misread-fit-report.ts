import type { FitData } from '../fit/fit-data';
import { divergenceInterval } from '../fit-report/divergence-interval';
import { readLevels, readWindow, type ReadChain } from '../misread/read-chain';
import { referenceLaws } from '../references/reference-laws';
import { cells } from '../resampling/cells';
import { divergence } from '../resampling/divergence';
import type { FittedTests } from '../resampling/fitted-tests';
import type { DiagnoseOptions, Diagnosis } from '../types';
import { sayRate } from '../words/say-rate';

/**
 * The `fit` part of the document for kinks read with misread sites. No floor is known for these laws beyond that no
 * divergence is below 0, so the fit is never certified as the best.
 *
 * @param drawnEven resamples came from equal bonds
 */
export function misreadFitReport(
  counts: FitData,
  chain: ReadChain,
  logLikelihood: number,
  fitted: FittedTests,
  options: DiagnoseOptions,
  drawnEven = false
): Diagnosis['fit'] {
  const plugIn = divergence(counts, logLikelihood);
  const where = chain.ring ? 'round a ring but for their even total' : 'along an open chain';
  const laid = cells(counts, readWindow(chain));
  const corrected =
    fitted.nullDivergences.length > 0
      ? divergenceInterval(
          counts,
          laid.law.map((f) => Math.log(f)),
          Math.log(laid.above),
          plugIn,
          fitted.nullDivergences,
          Math.log(laid.below)
        )
      : null;
  const noticed = corrected?.interval.low
    ? Math.ceil(Math.log(1 / options.alpha) / corrected.corrected)
    : null;
  return {
    logLikelihood,
    levels: readLevels(chain),
    poissonPart: 0,
    divergence: plugIn,
    floor: 0,
    divergenceCorrected: corrected?.corrected ?? null,
    divergenceInterval: corrected?.interval ?? { value: null, low: null, high: null },
    gSquared: 2 * counts.total * plugIn,
    shotsToNotice: noticed,
    certified: false,
    how: `Independent kinks of up to three probabilities ${where}, read with ${sayRate(chain.rate)} of the sites misread: equal bonds, two levels in stretches of many lengths, and halves of these, each by scoring. Other orders of the bonds were not searched, and no floor is known. The levels are those of the true kinks; the laws beside it are of counts without misreads${chain.ring ? ' and of either parity' : ''}.${drawnEven ? ' Equal bonds fit about as well and vary most, so the resamples of the tests were drawn from them.' : ''}`,
    ...referenceLaws(counts, options.supplied)
  };
}
