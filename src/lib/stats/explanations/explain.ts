import { bestLaw } from '../fit/best-law';
import { fitData } from '../fit/fit-data';
import { checkOptions } from '../input/check-options';
import { inUnits } from '../input/in-units';
import { toHistogram } from '../input/to-histogram';
import { momentReport } from '../moments/moment-report';
import { equalTrials } from '../references/equal-trials';
import { pacer } from '../resampling/pacer';
import type { CountData, DiagnoseOptions, OnProgress } from '../types';
import { explanationsOf } from './explanations-of';
import type { Explanations } from './types';

/**
 * What else the counts could be, whatever the answer of a diagnosis would be: on demand, where `diagnose` explains
 * only what it rules out. The same stories and numbers; the goodness of the best independent law, which is a test of
 * the diagnosis, is left out.
 *
 * @param data, options, onProgress, signal as for `diagnose`
 * @throws BadInput, with a reason in words
 */
export async function explain(
  data: CountData,
  options: DiagnoseOptions,
  onProgress?: OnProgress,
  signal?: AbortSignal
): Promise<Explanations> {
  checkOptions(options);
  const { histogram, trials } = inUnits(toHistogram(data), options.trials, options.unit);
  const pace = pacer(onProgress, signal);
  await pace.step('fit', 0);
  const counts = fitData(histogram, trials);
  const best = bestLaw(counts);
  const equal = equalTrials(counts, trials);
  const moments = momentReport(histogram, trials, equal.parameter, options);
  await pace.step('explanations', 0.2);
  return explanationsOf(counts, options, moments, { equal, best, fitTest: null }, pace.within(0.2, 1));
}
