import { oddCounts } from '../misread/odd-counts';
import type { DiagnoseOptions, Histogram } from '../types';
import { formatCount, formatNumber } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import type { PairsPart } from './types';

/** Single defects that give only even counts less often than this are no chance: e^−13.8 is one in a million. */
const bySingles = Math.log(1e-6);

/**
 * The `nuisances.pairs` of the document: whether to count pairs, and what odd counts on a ring say. undefined where pairs
 * are counted already, or where nothing points at a ring. Adds to a diagnosis and decides nothing in it.
 *
 * @param given counts of single defects
 * @param even shots with an even count, and the share that the best law expects; null with a lump
 * @param ringAsRead the law tested is of single kinks round a ring, read with misreads
 */
export function pairsReport(
  { counts, lump, below }: Histogram,
  shots: number,
  options: Pick<DiagnoseOptions, 'unit' | 'geometry' | 'trials'>,
  even: { seen: number; expected: number } | null,
  ringAsRead = false
): PairsPart | undefined {
  const { unit, geometry, trials } = options;
  if (unit === 'pair') return undefined;
  const all = even !== null && even.seen === shots && counts.some(([n]) => n > 0);
  // A law that gives no even count has no logarithm to tell.
  const logChance = even === null || !(even.expected > 0) ? null : shots * Math.log(even.expected);
  const telling = all && logChance !== null && logChance <= bySingles;
  const ring = geometry === 'ring-bonds';
  if (!telling && !ring) return undefined;
  if (ringAsRead)
    return {
      proposed: false,
      logChance,
      odd: null,
      statement:
        'No count is odd, as on a ring, misread or not: a misread site toggles two bonds. The law tested gives even counts only. Counting pairs tests something else: pairs that form independently, which vary about twice as much as single kinks do.'
    };
  const halves = trials === null || trials % 2 === 0;
  const odd =
    ring && trials !== null && lump === null && !below
      ? { ...oddCounts(counts, trials), shots: shots - even!.seen }
      : null;
  return { proposed: telling && halves, logChance, odd, statement: words(telling, halves, ring, shots, odd) };
}

function words(
  telling: boolean,
  halves: boolean,
  ring: boolean,
  shots: number,
  odd: PairsPart['odd']
): string {
  if (telling) {
    const seen = `Every one of the ${formatCount(shots)} counts is even, which single defects would not give in a million repeats.`;
    return halves
      ? `${seen} Count pairs: n/2 out of N/2.`
      : `${seen} Pairs need an even number of trials, and an odd one was given: on a ring the last bond holds no pair of its own, so give one trial less.`;
  }
  if (odd === null)
    return ring
      ? 'On a ring kinks come in pairs. How many odd counts there are, and so how often the reading failed, needs N and counts without lumps.'
      : '';
  if (odd.shots === 0)
    return 'No count is odd, as on a ring; there are too few defects or shots to say that this is no chance.';
  const bonds =
    odd.faultyBonds.value === null
      ? 'half of the shots or more are odd, which is no ring read badly but no ring at all'
      : `if bonds fail by themselves, one bond is missed or counted twice with a chance of ${sayInterval(odd.faultyBonds, 2)}`;
  return `${formatCount(odd.shots)} of ${formatCount(shots)} shots have an odd count, a share of ${sayInterval(odd.share, 2)}, which no ring gives: at least so many were read or written wrongly. If a fault leaves either parity alike, ${formatNumber(odd.faultyShots.value, 2)} of the shots are faulty; ${bonds}. A misread site toggles two bonds and keeps the parity, so these are lost sites, missed bonds or mistakes of the file; pairs can be counted once such shots are read again or set aside.`;
}
