import type { DiagnoseOptions } from '$lib/stats/types';
import { readKept } from '../../read-kept';
import type { Conditions } from './conditions';

type Experiment = 'trials' | 'unit' | 'geometry' | 'misread' | 'misreadUncertainty' | 'kept';

/**
 * What the conditions of a dataset say of the experiment, as options of a diagnosis. What is not stated and may be left
 * out is left out, as on the command line: jobs that were asked for before the condition existed stay the same jobs.
 */
export function optionsOfConditions(
  conditions: Pick<Conditions, Experiment>
): Pick<DiagnoseOptions, Experiment> {
  const { trials, unit, geometry, misread, misreadUncertainty } = conditions;
  const kept = conditions.kept === null ? null : readKept(conditions.kept);
  return {
    trials,
    unit,
    geometry,
    misread,
    ...(misreadUncertainty !== null && { misreadUncertainty }),
    ...(kept && { kept })
  };
}
