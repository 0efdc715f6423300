import { screenCaution } from '../answer/screen-caution';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { seesRise } from './sees-rise';
import type { VersionsReport } from './types';

type Found = Omit<VersionsReport, 'statement' | 'because' | 'cautions'>;

/** What the versions show, in words: where the scatter rose, what else changed, and what cannot be told. */
export function versionsWords(found: Found): Pick<VersionsReport, 'statement' | 'because' | 'cautions'> {
  return { statement: statementOf(found), because: becauseOf(found), cautions: cautionsOf(found) };
}

function statementOf({ cells, reference, tolerance }: Found): string {
  if (cells.length === 0) return 'There are no counts yet.';
  if (reference === null) return 'No reference version is chosen, so nothing is compared.';
  const risen = cells.filter(({ mark }) => mark === 'risen');
  if (risen.length === 0) {
    const compared = cells.filter(({ mark }) => mark !== 'reference');
    const seeing = compared.filter((cell) => seesRise(cell, tolerance)).length;
    if (seeing === 0) return `Nothing can be told of a rise over version ${reference}.`;
    const blind = compared.length - seeing;
    return `No rise over version ${reference} is seen in ${formatCount(seeing)} of ${formatCount(compared.length)} cells${blind > 0 ? `; ${formatCount(blind)} cannot tell` : ''}.`;
  }
  const versions = [...new Set(risen.map(({ version }) => version))];
  const where = versions.slice(0, 5).map((version) => {
    const count = risen.filter((cell) => cell.version === version).length;
    return `${version} (${count} ${count === 1 ? 'group' : 'groups'})`;
  });
  const more = versions.length > 5 ? ` and ${versions.length - 5} more` : '';
  return `The variance rises over version ${reference} in ${where.join(', ')}${more}.`;
}

function becauseOf({ cells, alpha, tolerance, pairs }: Found): string[] {
  const lines: string[] = [];
  const risen = cells
    .filter(({ mark }) => mark === 'risen')
    .toSorted((a, b) => (b.rise?.factor ?? 0) - (a.rise?.factor ?? 0));
  for (const { group, version, rise } of risen.slice(0, 5))
    lines.push(
      `${group}, ${version}: variance over ceiling is ${formatNumber(rise?.factor ?? null, 3)} of the reference (adjusted p = ${formatNumber(rise?.pAdjusted ?? null, 2)}).`
    );
  if (risen.length > 5) lines.push(`${risen.length - 5} more cells have risen.`);
  const count = (mark: string) => cells.filter((cell) => cell.mark === mark).length;
  const others = cells.filter(({ mark }) => mark === 'differs');
  const differs = others.length;
  const unseen = others.filter((cell) => !seesRise(cell, tolerance)).length;
  if (differs > 0)
    lines.push(
      `${formatCount(differs)} ${differs === 1 ? 'cell differs' : 'cells differ'} otherwise: another mean, or a smaller variance.${unseen > 0 ? ` In ${formatCount(unseen)} of them a rise of ${formatPercent(tolerance)} could not be seen.` : ''}`
    );
  const blind = count('cannot-tell');
  if (blind > 0)
    lines.push(
      `${formatCount(blind)} ${blind === 1 ? 'cell' : 'cells'} cannot tell: a rise of ${formatPercent(tolerance)} would be missed more than one time in five, or the counts cannot be compared.`
    );
  if (pairs) {
    const apart = pairs.tests.filter(({ pAdjusted }) => pAdjusted <= alpha).length;
    if (pairs.tests.length > 0)
      lines.push(
        pairs.tests.length === 1
          ? `${apart === 1 ? 'The two versions differ' : 'No difference of the two versions is seen'}. ${pairs.family}`
          : `${apart} of ${pairs.tests.length} pairs of versions differ. ${pairs.family}`
      );
    if (pairs.leftOut > 0)
      lines.push(
        `${formatCount(pairs.leftOut)} ${pairs.leftOut === 1 ? 'pair was' : 'pairs were'} not compared: another number of trials, unit, geometry, cut or lump makes counts differ without any crosstalk.`
      );
    if (!pairs.canReachAlpha)
      lines.push(
        `With ${formatCount(pairs.resamples)} shuffles no adjusted p can reach ${formatNumber(alpha, 2)}: ask for fewer versions.`
      );
  }
  return lines;
}

function cautionsOf({ cells, groups, reference, pairs }: Found): string[] {
  const compared = cells.filter(({ rise }) => rise !== null).length;
  const lines = [
    ...(reference === null
      ? []
      : [
          'Limits hold 99.73\u202f% of versions with the law of the reference, each cell by itself: of 1000 quiet cells some three leave them.',
          ...(compared > 1 ? [besideGate(compared, 2 * groups.length)] : [])
        ]),
    ...(pairs
      ? ['Pairs differ for any reason, another mean included; that is no sign of crosstalk by itself.']
      : []),
    'A rise has more causes than crosstalk: drift, misreads that follow each other, and mixed settings look alike.'
  ];
  return [...lines, screenCaution];
}

/** Why the gate of a version may see what its marks do not; `tests` is how many a gate over all groups makes. */
function besideGate(compared: number, tests: number): string {
  const here = `Marks are adjusted over ${formatCount(compared)} cells of all versions together; a gate takes one version alone, with two tests a group`;
  return compared > tests
    ? `${here}. So less is seen here than at the gate: a cell that cannot tell here may pass there.`
    : `${here}. So the gate may tell where a cell cannot, or the other way round.`;
}
