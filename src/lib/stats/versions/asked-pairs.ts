import type { Pace } from '../resampling/pace';
import { cellMoments } from './cell-moments';
import { comparePairs } from './compare-pairs';
import { notAlike } from './not-alike';
import type { VersionCell, VersionsOptions, VersionsReport } from './types';

/** Shuffles of one pair at most, and at least. */
const MOST = 99_999;
const LEAST = 1999;

/**
 * The pairs asked for, tested by comparePairs within each group. Shuffles are as many as let the smallest adjusted p be a
 * quarter of alpha, 100 000 at most: `canReachAlpha` says whether that sufficed. Cells without shots are left out, and pairs of
 * counts of another kind: other trials, unit, geometry, cut or lump differ without any crosstalk.
 */
export async function askedPairs(
  cells: VersionCell[],
  { groups, versions, seed }: NonNullable<VersionsOptions['pairs']>,
  alpha: number,
  pace: Pace
): Promise<NonNullable<VersionsReport['pairs']>> {
  const asked = groups.map((group) => ({
    group,
    versions: cells
      .filter(
        (cell) => cell.group === group && versions.includes(cell.version) && cellMoments(cell).shots > 0
      )
      .map(({ version, histogram }) => ({ version, histogram }))
  }));
  const most = Math.max(1, ...asked.map(({ versions: { length } }) => (length * (length - 1)) / 2));
  const resamples = Math.min(MOST, Math.max(LEAST, Math.ceil((4 * most) / alpha) - 1));
  const of = new Map(cells.map((cell) => [JSON.stringify([cell.group, cell.version]), cell]));
  const alike = (group: string, first: string, second: string) => {
    const [a, b] = [first, second].map((version) => of.get(JSON.stringify([group, version]))!);
    return notAlike(a, b).length === 0 && a.trials === b.trials && shownOf(a) === shownOf(b);
  };
  const found = await comparePairs(asked, { resamples, seed, alike }, pace);
  return { ...found, versions, resamples, canReachAlpha: most / (resamples + 1) <= alpha };
}

/** Which counts a histogram shows one by one: those kept, and where lumps begin. */
const shownOf = ({ kept, histogram: { lump, below } }: VersionCell): string =>
  JSON.stringify([kept?.from ?? 0, kept?.to ?? null, lump?.from ?? null, below?.to ?? null]);
