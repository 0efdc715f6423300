import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import { inUnits } from '../../../stats/input/in-units';
import { toHistogram } from '../../../stats/input/to-histogram';
import { BadInput, type CountData, type Unit } from '../../../stats/types';

/** Conditions that the counts contradict: trials below a count that was seen, pairs with odd counts. Empty when they fit. */
export function misfits(
  conditions: { trials: number | null; unit: Unit },
  data: CountData
): ConditionProblems {
  const histogram = toHistogram(data);
  const reasonOf = (trials: number | null, unit: Unit): string | null => {
    try {
      inUnits(histogram, trials, unit);
      return null;
    } catch (error) {
      if (error instanceof BadInput) return error.reason;
      throw error;
    }
  };
  const above = reasonOf(conditions.trials, 'defect');
  if (above) return { trials: above };
  const pairs = reasonOf(null, conditions.unit);
  if (pairs) return { unit: pairs };
  const odd = reasonOf(conditions.trials, conditions.unit);
  return odd ? { trials: odd } : {};
}
