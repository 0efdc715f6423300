import { screenCaution } from '../answer/screen-caution';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import type { VersionsReport } from './types';

type Found = Omit<VersionsReport, 'statement' | 'because' | 'cautions'>;

/** What the versions show, in words: where the scatter rose, what else changed, and what cannot be told. */
export function versionsWords(found: Found): Pick<VersionsReport, 'statement' | 'because' | 'cautions'> {
  return { statement: statementOf(found), because: becauseOf(found), cautions: cautionsOf(found) };
}

function statementOf({ cells, reference }: Found): string {
  if (cells.length === 0) return 'There are no counts yet.';
  if (reference === null) return 'No reference version is chosen, so nothing is compared.';
  const risen = cells.filter(({ mark }) => mark === 'risen');
  if (risen.length === 0)
    return cells.some(({ mark }) => mark === 'no-difference-seen' || mark === 'differs')
      ? `Nowhere does the variance rise over version ${reference}, as far as the shots tell.`
      : `Nothing can be told of a rise over version ${reference}.`;
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
  const differs = count('differs');
  if (differs > 0)
    lines.push(
      `${formatCount(differs)} ${differs === 1 ? 'cell differs' : 'cells differ'} otherwise: another mean, or a smaller variance.`
    );
  const blind = count('cannot-tell');
  if (blind > 0)
    lines.push(
      `${formatCount(blind)} ${blind === 1 ? 'cell' : 'cells'} cannot tell: a rise of ${formatPercent(tolerance)} would be missed more than one time in five, or the counts cannot be compared.`
    );
  if (pairs) {
    const apart = pairs.tests.filter(({ pAdjusted }) => pAdjusted <= alpha).length;
    lines.push(`${apart} of ${pairs.tests.length} pairs of versions differ. ${pairs.family}`);
    if (!pairs.canReachAlpha)
      lines.push(
        `With ${formatCount(pairs.resamples)} shuffles no adjusted p can reach ${formatNumber(alpha, 2)}: ask for fewer versions.`
      );
  }
  return lines;
}

function cautionsOf({ reference, pairs }: Found): string[] {
  const lines = [
    ...(reference === null
      ? []
      : [
          'Limits hold 99.73\u202f% of versions with the law of the reference, each cell by itself: of 1000 quiet cells some three leave them. Marks are adjusted over all cells.'
        ]),
    ...(pairs
      ? ['Pairs differ for any reason, another mean included; that is no sign of crosstalk by itself.']
      : []),
    'A rise has more causes than crosstalk: drift, misreads that follow each other, and mixed settings look alike.'
  ];
  return [...lines, screenCaution];
}
