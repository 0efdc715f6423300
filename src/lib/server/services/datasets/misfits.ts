import type { Conditions } from '../../../model/team/datasets/conditions';
import { optionsOfConditions } from '../../../model/team/datasets/options-of-conditions';
import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import { SETTING_WORDS } from '../../../model/setting-words';
import { defaultOptions } from '../../../stats/default-options';
import { fitData } from '../../../stats/fit/fit-data';
import { checkOptions } from '../../../stats/input/check-options';
import { inUnits } from '../../../stats/input/in-units';
import { toHistogram } from '../../../stats/input/to-histogram';
import { keptCounts } from '../../../stats/nulls/kept-counts';
import { misreadApplies } from '../../../stats/nulls/misread-applies';
import { needTrialsForCut } from '../../../stats/nulls/need-trials-for-cut';
import { BadInput, type CountData } from '../../../stats/types';

type Experiment = Pick<
  Conditions,
  'trials' | 'unit' | 'geometry' | 'misread' | 'misreadUncertainty' | 'kept'
>;

/**
 * Conditions that contradict each other or the counts: trials below a count that was seen, pairs with odd counts, a cut
 * that leaves nothing or that the counts pass, an uncertainty without its rate. In the words of a diagnosis, which would
 * refuse them. Empty when they fit.
 */
export function misfits(conditions: Experiment, data: CountData): ConditionProblems {
  const { trials, unit } = conditions;
  const histogram = toHistogram(data);
  const above = refusal(() => inUnits(histogram, trials, 'defect'));
  if (above) return { trials: above };
  const pairs = refusal(() => inUnits(histogram, null, unit));
  if (pairs) return { unit: pairs };
  const odd = refusal(() => inUnits(histogram, trials, unit));
  if (odd) return { trials: odd };
  if (conditions.misreadUncertainty !== null && conditions.misread === null)
    return { misreadUncertainty: SETTING_WORDS.uncertaintyAlone };
  if (conditions.kept === null) return {};
  const cut = refusal(() => {
    const options = { ...defaultOptions, ...optionsOfConditions(conditions) };
    checkOptions(options);
    const tested = inUnits(histogram, trials, unit);
    needTrialsForCut(tested.trials);
    const counts = fitData(tested.histogram, tested.trials);
    keptCounts(options, tested.histogram, counts, misreadApplies(options, counts));
  });
  return cut ? { kept: cut } : {};
}

function refusal(attempt: () => unknown): string | null {
  try {
    attempt();
    return null;
  } catch (error) {
    if (error instanceof BadInput) return error.reason;
    throw error;
  }
}
