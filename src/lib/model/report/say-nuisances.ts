import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { FLAGS, GEOMETRIES, TESTS } from '../labels';
import { sayP } from '../say-p';
import { sayCriticalTrials } from './say-critical-trials';

/** What people stated besides the counts; null where they did not. */
export interface Stated {
  trialsWhy?: string | null;
  postSelection?: string | null;
}

/** What can mimic interaction, as pairs of what and what this report knows of it. */
export const sayNuisances = (document: Diagnosis, stated: Stated | null): [string, string][] => [
  ['Misread sites', misreads(document)],
  ['Drift', drift(document)],
  ['Pairs', pairs(document)],
  [
    'Post-selection',
    stated?.postSelection
      ? `Stated: ${stated.postSelection}. Dropping empty shots or large counts makes counts look more regular than they were.`
      : 'None is stated. Dropping empty shots or large counts would make counts look more regular than they were.'
  ],
  [
    'Lumped counts',
    document.data.lump === null
      ? 'No row lumps counts.'
      : `The last row holds all counts of ${formatCount(document.data.lump.from)} and more; its likelihood is the sum of the law over them, and the ceiling is that of equal trials lumped in the same way.`
  ],
  ['N too small', trials(document, stated)]
];

const flagged = ({ flags }: Diagnosis, id: Diagnosis['flags'][number]['id']): string => {
  const flag = flags.find((one) => one.id === id);
  return flag ? ` Flagged here: ${FLAGS[id]}, ${flag.grade === 'shown' ? 'shown' : 'hinted at'}.` : '';
};

function misreads(document: Diagnosis): string {
  const { misread, geometry } = document.data;
  const chance =
    misread === null
      ? 'The chance to misread a site is not stated.'
      : `The chance to misread a site is stated as ${formatNumber(misread, 3)}.`;
  const effect =
    geometry === 'sites'
      ? 'On sites that are read one by one, independent misreads keep counts a sum of independent trials.'
      : 'On bonds one misread site toggles two neighbours, so that independent defects can look bunched.';
  return `Counted on: ${GEOMETRIES[geometry]}. ${chance} ${effect}${flagged(document, 'misreads')}`;
}

function drift(document: Diagnosis): string {
  if (!document.data.ordered)
    return 'The order of the shots is not known: a probability that drifts between shots widens the counts, and cannot be told from bunching here.';
  const ran = document.tests.filter(({ id }) => id === 'batches' || id === 'order');
  const said = ran.map(
    (test) => `${TESTS[test.id]}: a result as extreme ${sayP(test.p, test.smallestP, test.resamples)}`
  );
  return `The order of the shots is known. ${said.length > 0 ? `${said.join('; ')}.` : 'No test of it could run.'}${flagged(document, 'drift')}`;
}

function pairs(document: Diagnosis): string {
  const { unit, geometry } = document.data;
  if (unit === 'pair') return 'Counts are even by construction: n/2 out of N/2 is tested.';
  const ring = geometry === 'ring-bonds' ? ' On a ring every count is even: give the unit as pairs.' : '';
  return `Single defects are tested.${ring}${flagged(document, 'pairing')}`;
}

function trials(document: Diagnosis, stated: Stated | null): string {
  const { trials } = document.data;
  const why = stated?.trialsWhy ? `Stated reason: ${stated.trialsWhy}.` : 'No reason for this N is stated.';
  const given =
    trials === null ? 'N is unknown; no limit is assumed.' : `N is ${formatCount(trials)}. ${why}`;
  return `${given} ${sayCriticalTrials(document)}`;
}
