import { formatNumber, formatPercent } from '../words/format-number';
import type { OpenGroup } from './gate-group';
import { sayRise } from './say-rise';
import type { GateGroup, GateRule } from './types';

/** Where any excess at all is refused, shots have to show one of this size. */
const SMALLEST_TOLERANCE = 0.1;

/** The rise that shots have to show. */
const wantedOf = ({ tolerance }: GateRule): number => (tolerance === 0 ? SMALLEST_TOLERANCE : tolerance);

/** A group's outcome from its adjusted tests, with the reasons in words. */
export function outcomeOfGroup(group: OpenGroup, rule: GateRule, version: string): GateGroup {
  const failures: string[] = [];
  const { overTolerance, overReference, smallestRise, dispersion } = group;
  if (overTolerance && dispersion && overTolerance.pAdjusted <= rule.alpha)
    failures.push(
      `Variance is ${formatNumber(dispersion.value, 3)} of its ceiling, above ${formatNumber(1 + rule.tolerance, 3)} by more than chance allows (adjusted p = ${formatNumber(overTolerance.pAdjusted, 2)}).`
    );
  if (overReference && overReference.pAdjusted <= rule.alpha)
    failures.push(
      `Variance over ceiling is ${formatNumber(overReference.factor, 3)} of that of version ${rule.reference}, a rise by more than chance allows (adjusted p = ${formatNumber(overReference.pAdjusted, 2)}).`
    );
  const [hindrances, reasons] = [[...group.hindrances], [...group.reasons]];
  const hinder = (hindrance: 'too-few-shots' | 'above-tolerance', reason: string) => {
    hindrances.push(hindrance);
    reasons.push(reason);
  };
  const wanted = wantedOf(rule);
  const step = stepSeen(group, rule);
  if (step !== null && step > wanted)
    hinder(
      'too-few-shots',
      `Too few shots: a rise under ${sayRise(step, wanted)} ${smallestRise === null ? `beyond the tolerance` : `over version ${rule.reference}`} would be missed more than one time in five, and ${formatPercent(wanted)} has to be seen.`
    );
  const most = 1 + rule.tolerance;
  if (failures.length === 0 && dispersion && dispersion.low > most)
    hinder(
      'above-tolerance',
      `Variance is ${formatNumber(dispersion.value, 4)} of its ceiling, with a 95 % interval of its own that lies above ${formatNumber(most, 3)}; among all tests of this gate that is not enough to fail it, and too much to pass.`
    );
  if (failures.length > 0)
    return { ...group, hindrances, outcome: 'failed', reasons: [...failures, ...reasons] };
  if (hindrances.length > 0) return { ...group, hindrances, outcome: 'undecided', reasons };
  return { ...group, outcome: 'passed', reasons: [passing(group, rule, version)] };
}

/**
 * Smallest rise that these shots show: over the reference, where there is one; of the reference itself, beyond the tolerance.
 * The rise over a reference has the larger error, so it decides for both tests.
 */
function stepSeen({ smallestRise, smallestExcess }: OpenGroup, { tolerance }: GateRule): number | null {
  if (smallestRise !== null) return smallestRise;
  return smallestExcess === null ? null : (1 + smallestExcess) / (1 + tolerance) - 1;
}

function passing({ smallestRise, dispersion }: OpenGroup, rule: GateRule, version: string): string {
  const wanted = wantedOf(rule);
  const most = formatNumber(1 + rule.tolerance, 3);
  const value = dispersion ? formatNumber(dispersion.value, 4) : '–';
  const above = dispersion !== null && dispersion.value > 1 + rule.tolerance;
  const seen = above
    ? `Variance is ${value} of its ceiling: above ${most}, but not by more than chance allows at this level`
    : `Variance is ${value} of its ceiling, not above ${most}`;
  if (smallestRise === null) return `${seen}; version ${version} is the reference itself.`;
  return `${seen}, and not above that of version ${rule.reference} by more than chance allows; a rise under ${sayRise(smallestRise, wanted)} would be missed more than one time in five.`;
}
