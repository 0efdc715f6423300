import type { FitData } from '../fit/fit-data';
import type { ReadChain } from '../misread/read-chain';
import type { FittedTests } from '../resampling/fitted-tests';
import type { DiagnoseOptions, Diagnosis, ReferenceId } from '../types';
import { sayKept } from '../words/say-kept';
import { misreadFitReport } from './misread-fit-report';

/**
 * The `fit` part of the document where only some counts were kept. No floor is known for laws so cut.
 *
 * @param found likelihood of the law, how it was found, and whether resamples came from equal trials so cut
 */
export function keptFitReport(
  counts: FitData,
  chain: ReadChain,
  found: { value: number; how: string; drawnEven: boolean },
  fitted: FittedTests,
  options: DiagnoseOptions
): Diagnosis['fit'] {
  const left: ReferenceId[] = ['equal-trials', 'rare-events', 'gaussian', 'landau-zener'];
  return {
    ...misreadFitReport(counts, chain, found.value, fitted, options),
    how: `Independent trials of which only ${sayKept(options.kept!)} were kept: ${found.how}, of the likelihood given the cut. No floor is known. The levels are those before the cut.${found.drawnEven ? ' Equal trials so cut fit about as well and vary most, so the resamples of the tests were drawn from them.' : ''}`,
    references: [],
    omitted: [...left, ...(options.supplied ? (['supplied'] as const) : [])].map((id) => ({
      id,
      reason: 'It knows nothing of the cut.'
    }))
  };
}
