import { sayKept } from '$lib/stats/words/say-kept';
import type { Diagnosis } from '$lib/stats/types';
import { formatCount } from '../format-number';
import { endAsTyped } from './as-typed';
import { sayCriticalTrials } from './say-critical-trials';
import { sayChange, sayDrift, sayWithin } from './say-drift';
import { sayLumpedLimits } from './say-lumped-limits';
import { sayFlagged } from './say-flagged';
import {
  sayKinks,
  sayLargestRate,
  sayMisreads,
  sayNeededRate,
  sayRateSpread,
  sayTwoCeilings
} from './say-misreads';

/** Title of that part of a report. */
export const NUISANCES_TITLE = 'What can look like interaction';

/** What people stated besides the counts: null where they did not, left out where it is not told. */
export interface Stated {
  trialsWhy?: string | null;
  postSelection?: string | null;
}

/**
 * What can mimic interaction, as pairs of what and what this report knows of it.
 *
 * @param stated null where what people stated is not told, as on a blind link
 */
export const sayNuisances = (document: Diagnosis, stated: Stated | null): [string, string][] =>
  told([
    ['Misread sites', sayMisreads(document)],
    ['Ceiling as read', sayTwoCeilings(document)],
    ['Misread rate needed', sayNeededRate(document)],
    ['Largest misread rate', sayLargestRate(document)],
    ['Over the rate’s uncertainty', sayRateSpread(document)],
    ['Kinks along the chain', sayKinks(document)],
    ['Drift', sayDrift(document)],
    ['Within batches', sayWithin(document.nuisances?.drift)],
    ['Change of the mean', sayChange(document.nuisances?.drift)],
    ['Pairs', sayPairs(document)],
    ['Without empty shots', document.nuisances?.emptyAside?.statement ?? null],
    ['Odd counts', document.nuisances?.pairs?.statement ?? null],
    ['Post-selection', sayCut(document) ?? sayPostSelection(stated)],
    ['Lumped counts', sayLumped(document)],
    ['N too small', trials(document, stated)],
    ['As N runs', document.nuisances?.trials?.statement ?? null]
  ]);

/** The rows that have something to tell. */
export const told = (rows: [string, string | null][]): [string, string][] =>
  rows.filter((row): row is [string, string] => row[1] !== null);

export function sayPairs(
  view: Pick<Diagnosis, 'flags'> & {
    data: Pick<Diagnosis['data'], 'unit' | 'geometry'>;
    nuisances?: { misread?: { applied: boolean } };
  }
): string {
  const { unit, geometry } = view.data;
  if (unit === 'pair') return 'Counts are even by construction: n/2 out of N/2 is tested.';
  if (view.nuisances?.misread?.applied && geometry === 'ring-bonds')
    return `Single kinks are tested, which form independently but for their even total; the law tested gives even counts only.${sayFlagged(view, 'pairing')}`;
  const ring = geometry === 'ring-bonds' ? ' On a ring every count is even: give the unit as pairs.' : '';
  return `Single defects are tested.${ring}${sayFlagged(view, 'pairing')}`;
}

function sayLumped(document: Diagnosis): string {
  const { lump, below } = document.data;
  const first = below && `The first row holds all counts of ${formatCount(below.to)} and fewer`;
  const last =
    lump && `${first ? 'the' : 'The'} last row holds all counts of ${formatCount(lump.from)} and more`;
  if (!first && !last) return 'No row lumps counts.';
  const rows = first && last ? `${first}, ${last}` : (first ?? last);
  return [
    `${rows}; its likelihood is the sum of the law over them, and the ceiling is that of equal trials lumped in the same way.`,
    ...sayLumpedLimits(document)
  ].join(' ');
}

/** Where the counts kept are stated to the engine, what it makes of them. */
function sayCut({ data }: Diagnosis): string | null {
  return data.kept
    ? `Only ${sayKept(data.kept)} were kept. Laws, ceiling and tests are of counts cut so, and the cut by itself no longer makes them look regular.`
    : null;
}

export function sayPostSelection(stated: Stated | null): string {
  const effect = 'Dropping empty shots or large counts makes counts look more regular than they were.';
  if (stated?.postSelection === undefined) return `Whether shots were dropped is not told here. ${effect}`;
  if (!stated.postSelection) return `None is stated. ${effect}`;
  return `Stated: ${endAsTyped(stated.postSelection)} ${effect}`;
}

function trials(document: Diagnosis, stated: Stated | null): string {
  const { trials } = document.data;
  const why =
    stated?.trialsWhy === undefined
      ? ''
      : stated.trialsWhy
        ? ` Stated reason: ${endAsTyped(stated.trialsWhy)}`
        : ' No reason for this N is stated.';
  const given = trials === null ? 'N is unknown; no limit is assumed.' : `N is ${formatCount(trials)}.${why}`;
  return `${given} ${sayCriticalTrials(document)}`;
}
