import { holm } from '../multiple/holm';
import { BadInput } from '../types';
import { gateGroup, type OpenGroup } from './gate-group';
import { gateWords } from './gate-words';
import { outcomeOfGroup } from './outcome-of-group';
import type { GateReport, GateRule, VersionCell } from './types';

/**
 * Does a version pass its gate? In each group two one-sided tests: is variance/ceiling above 1 + tolerance, and above that
 * of the reference (dispersionRise)? Holm's rule takes all of them together; tests that cannot be made yet count with
 * p = 1, so that a version that has failed does not pass when the missing groups come in. It fails with any adjusted
 * p ≤ alpha, is undecided where a group cannot be judged, and passes otherwise. A reference is held to the tolerance alone.
 *
 * @param cells of the version and of the reference, one for each group; others are passed over
 * @throws BadInput for a tolerance below 0, an alpha outside 0 … 1, no groups at all, or two cells at one place
 *
 * Source: Holm 1979, Scand. J. Statist. 6:65.
 */
export function gateReport(rule: GateRule, version: string, cells: VersionCell[]): GateReport {
  if (!(rule.tolerance >= 0 && Number.isFinite(rule.tolerance)))
    throw new BadInput('The tolerance of a gate is a number from 0 on.');
  if (!(rule.alpha > 0 && rule.alpha < 1)) throw new BadInput('The level of a gate lies between 0 and 1.');
  const mine = byGroup(cells, version);
  const theirs = rule.reference === null ? new Map<string, VersionCell>() : byGroup(cells, rule.reference);
  const names = [...new Set(rule.groups ?? [...theirs.keys(), ...mine.keys()])];
  if (names.length === 0) throw new BadInput('There are no groups to judge.');
  const tests = names.length * (rule.reference === version ? 1 : 2);
  const open = names.map((group) =>
    gateGroup({ group, rule, version, tests }, mine.get(group), theirs.get(group))
  );
  const ran = open.flatMap(({ overTolerance, overReference }) => [overTolerance, overReference]);
  const made = ran.filter((test) => test !== null);
  const padded = [...made.map(({ p }) => p), ...new Array<number>(tests - made.length).fill(1)];
  holm(padded).forEach((p, i) => {
    if (i < made.length) made[i].pAdjusted = p;
  });
  const groups = open.map((group: OpenGroup) => outcomeOfGroup(group, rule, version));
  const outcome = (['failed', 'undecided'] as const).find((one) =>
    groups.some((group) => group.outcome === one)
  );
  const report = {
    format: 'severalty.gate/1' as const,
    version,
    rule,
    outcome: outcome ?? ('passed' as const),
    tests,
    groups
  };
  return { ...report, ...gateWords(report) };
}

function byGroup(cells: VersionCell[], version: string): Map<string, VersionCell> {
  const found = new Map<string, VersionCell>();
  for (const cell of cells) {
    if (cell.version !== version) continue;
    if (found.has(cell.group)) throw new BadInput(`Group ${cell.group} stands twice in version ${version}.`);
    found.set(cell.group, cell);
  }
  return found;
}
