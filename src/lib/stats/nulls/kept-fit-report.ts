import type { FitData } from '../fit/fit-data';
import type { ReadChain } from '../misread/read-chain';
import type { FittedTests } from '../resampling/fitted-tests';
import type { DiagnoseOptions, Diagnosis, ReferenceId } from '../types';
import { sayKept } from '../words/say-kept';
import { misreadFitReport } from './misread-fit-report';

/**
 * The `fit` part of the document where only some counts were kept. No floor is known for laws so cut.
 *
 * @param drawnEven resamples came from equal trials so cut
 */
export function keptFitReport(
  counts: FitData,
  chain: ReadChain,
  logLikelihood: number,
  fitted: FittedTests,
  options: DiagnoseOptions,
  drawnEven = false
): Diagnosis['fit'] {
  const left: ReferenceId[] = ['equal-trials', 'rare-events', 'gaussian', 'landau-zener'];
  return {
    ...misreadFitReport(counts, chain, logLikelihood, fitted, options),
    how: `Independent trials of up to three probabilities, of which only ${sayKept(options.kept!)} were kept: equal trials, two levels of many sizes, and halves of these, each by scoring of the likelihood given the cut. No floor is known. The levels are those before the cut.${drawnEven ? ' Equal trials so cut fit about as well and vary most, so the resamples of the tests were drawn from them.' : ''}`,
    references: [],
    omitted: [...left, ...(options.supplied ? (['supplied'] as const) : [])].map((id) => ({
      id,
      reason: 'It knows nothing of the cut.'
    }))
  };
}
