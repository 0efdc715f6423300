import { screenCaution } from '../answer/screen-caution';
import type { GateReport } from './types';

type Found = Omit<GateReport, 'statement' | 'because' | 'cautions'>;

/** A gate's answer in words: the outcome, the reasons group by group, and what the outcome does not say. */
export function gateWords(found: Found): Pick<GateReport, 'statement' | 'because' | 'cautions'> {
  const { version, outcome, groups, rule, tests } = found;
  const named = groups.filter((group) => group.outcome === outcome).map(({ group }) => group);
  const of = `${named.length} of ${groups.length} ${groups.length === 1 ? 'group' : 'groups'}`;
  const statement = {
    failed: `Version ${version} fails: ${of} ${named.length === 1 ? 'scatters' : 'scatter'} more than the rule allows (${listed(named)}).`,
    undecided: `Version ${version} is undecided: ${of} cannot be judged (${listed(named)}).`,
    passed: `Version ${version} passes: ${groups.length === 1 ? 'its group is not' : `no group of ${groups.length} is`} seen to scatter more than the rule allows.`
  }[outcome];
  const because = groups
    .filter((group) => outcome === 'passed' || group.outcome !== 'passed')
    .flatMap(({ group, reasons }) => reasons.map((reason) => `${group}: ${reason}`));
  return {
    statement,
    because,
    cautions: [
      `${tests === 1 ? 'The one test of this gate is held' : `The ${tests} tests of this gate are adjusted for each other by Holm’s rule and held`} to ${Number((100 * rule.alpha).toPrecision(12))}\u202f%; over many versions a gate fails one without cause now and then, each time with at most that chance.`,
      'To pass says that no rise was seen, not that there is none. A rise has more causes than crosstalk: drift, misreads that follow each other, and mixed settings look alike.',
      screenCaution
    ]
  };
}

function listed(names: string[]): string {
  const shown = names.slice(0, 8).join(', ');
  return names.length > 8 ? `${shown} and ${names.length - 8} more` : shown;
}
