import { unbroken, type Pace } from '../resampling/pace';
import { BadInput } from '../types';
import { askedPairs } from './asked-pairs';
import { cellReport } from './cell-report';
import { markCells } from './mark-cells';
import type { VersionCell, VersionsOptions, VersionsReport } from './types';
import { versionsWords } from './versions-words';

/**
 * Everything told of a device's versions, as one plain document: mean and variance/ceiling of each group under each version
 * with 95 % intervals, limits and marks against a reference, the pairs asked for tested by shuffles, and the answer in
 * words. Without pairs it takes some microseconds a cell.
 *
 * @throws BadInput for a version that is not listed or listed twice, two cells at one place, a reference without a place,
 *   alpha outside 0 … 1, a tolerance not above 0, or pairs without shots
 */
export async function versionsReport(
  cells: VersionCell[],
  options: VersionsOptions,
  pace: Pace = unbroken
): Promise<VersionsReport> {
  const { versions, reference, alpha, tolerance, pairs } = options;
  if (!(alpha > 0 && alpha < 1)) throw new BadInput('The level lies between 0 and 1.');
  if (!(tolerance > 0 && Number.isFinite(tolerance))) throw new BadInput('The tolerance lies above 0.');
  const place = new Map(versions.map((version, i) => [version, i]));
  if (place.size < versions.length) throw new BadInput('A version is listed twice.');
  if (reference !== null && !place.has(reference))
    throw new BadInput(`Version ${reference}, the reference, is not among the versions.`);
  const taken = new Map<string, VersionCell>();
  for (const cell of cells) {
    if (!place.has(cell.version)) throw new BadInput(`Version ${cell.version} is not among the versions.`);
    const key = JSON.stringify([cell.group, cell.version]);
    if (taken.has(key)) throw new BadInput(`Group ${cell.group} stands twice in version ${cell.version}.`);
    taken.set(key, cell);
  }
  const groups = [...new Set(cells.map(({ group }) => group))];
  const rows = new Map(groups.map((group, i) => [group, i]));
  const sorted = cells.toSorted(
    (a, b) => rows.get(a.group)! - rows.get(b.group)! || place.get(a.version)! - place.get(b.version)!
  );
  const open = sorted.map((cell) => {
    const against = reference === null ? undefined : taken.get(JSON.stringify([cell.group, reference]));
    const found = cellReport(cell, against);
    if (reference !== null && !against) found.hindrances = [...found.hindrances, 'no-reference'];
    return found;
  });
  const report = {
    format: 'severalty.versions/1' as const,
    reference,
    alpha,
    tolerance,
    versions,
    groups,
    cells: markCells(open, options),
    pairs: pairs === null ? null : await askedPairs(sorted, pairs, alpha, pace)
  };
  return { ...report, ...versionsWords(report) };
}
