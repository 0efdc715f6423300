import { formatNumber, formatPercent } from '../words/format-number';
import type { OpenGroup } from './gate-group';
import type { GateGroup, GateRule } from './types';

/** Where any excess at all is refused, shots have to show one of this size. */
const SMALLEST_TOLERANCE = 0.1;

/** A group's outcome from its adjusted tests, with the reasons in words. */
export function outcomeOfGroup(group: OpenGroup, rule: GateRule, version: string): GateGroup {
  const failures: string[] = [];
  const { overTolerance, overReference, smallestExcess, dispersion } = group;
  if (overTolerance && dispersion && overTolerance.pAdjusted <= rule.alpha)
    failures.push(
      `Variance is ${formatNumber(dispersion.value, 3)} of its ceiling, above ${formatNumber(1 + rule.tolerance, 3)} by more than chance allows (adjusted p = ${formatNumber(overTolerance.pAdjusted, 2)}).`
    );
  if (overReference && overReference.pAdjusted <= rule.alpha)
    failures.push(
      `Variance over ceiling is ${formatNumber(overReference.factor, 3)} of that of version ${rule.reference}, a rise by more than chance allows (adjusted p = ${formatNumber(overReference.pAdjusted, 2)}).`
    );
  const wanted = rule.tolerance === 0 ? SMALLEST_TOLERANCE : rule.tolerance;
  const short = smallestExcess !== null && smallestExcess > wanted;
  const hindrances = short ? [...group.hindrances, 'too-few-shots' as const] : group.hindrances;
  const reasons = short
    ? [
        ...group.reasons,
        `Too few shots: an excess under ${formatPercent(smallestExcess)} of the ceiling would be missed more than one time in five, and ${formatPercent(wanted)} has to be seen.`
      ]
    : group.reasons;
  if (failures.length > 0)
    return { ...group, hindrances, outcome: 'failed', reasons: [...failures, ...reasons] };
  if (hindrances.length > 0) return { ...group, hindrances, outcome: 'undecided', reasons };
  return { ...group, outcome: 'passed', reasons: [passing(group, rule, version)] };
}

function passing({ smallestRise }: OpenGroup, rule: GateRule, version: string): string {
  if (smallestRise === null)
    return `No excess above ${formatPercent(rule.tolerance)} is seen; version ${version} is the reference itself.`;
  return `Neither an excess above ${formatPercent(rule.tolerance)} nor a rise over version ${rule.reference} is seen; a rise under ${formatPercent(smallestRise)} would be missed more than one time in five.`;
}
