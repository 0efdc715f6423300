import { formatCount } from '$lib/model/format-number';
import type { MapsComparedReport } from '$lib/stats/sites/maps-compared';
import type { SitesReport } from '$lib/stats/sites/sites-types';

/** What the map of pairs shows, in one line. */
export function siteMapTitle({ names, pairs, alpha, common }: SitesReport): string {
  const found = pairs.filter(({ pHolm }) => pHolm <= alpha);
  const all = formatCount(pairs.length);
  if (common.shown && found.length !== 1)
    return `${(common.mean ?? 0) > 0 ? 'All sites move together' : 'Sites avoid each other on the whole'}: no pair can be read by itself`;
  if (found.length === 0) return `No pair of ${all} stands out from chance`;
  if (found.length > 1) return `${formatCount(found.length)} pairs of ${all} stand out from chance`;
  const [{ first, second, distance }] = found;
  return `One pair of ${all} stands out from chance: sites ${names[first]} and ${names[second]}, ${distance === 1 ? 'neighbours' : `${distance} apart`}`;
}

/** How many of 95 % intervals leave their value without cause. */
const sayExpected = (many: number): string =>
  many < 0.75 ? 'fewer than one' : `about ${formatCount(Math.round(many))}`;

/** Whether the mean correlation leaves 0 anywhere, beside what chance alone would do. */
export function siteDistanceTitle({ byDistance }: Pick<SitesReport, 'byDistance'>): string {
  const known = byDistance.filter(({ low, high }) => low !== null && high !== null);
  if (known.length === 0) return 'Too few shots for the errors of a mean correlation';
  const away = known.filter(({ low, high }) => low! > 0 || high! < 0);
  if (away.length === 0) return 'The mean correlation is compatible with 0 at every distance';
  const first = away.map(({ distance }) => distance).includes(1);
  return `The mean correlation leaves 0 at ${formatCount(away.length)} of ${formatCount(known.length)} distances${first ? ', neighbours among them' : ''}; ${sayExpected(known.length / 20)} would by chance alone`;
}

/** Which pairs changed between two maps, in one line. */
export function siteChangeTitle({ names, pairs, alpha, common }: MapsComparedReport): string {
  const changed = pairs.filter(({ pHolm }) => pHolm <= alpha);
  const all = formatCount(pairs.length);
  if (common) return 'All sites of a map move together or apart: no change of a pair can be read by itself';
  if (changed.length === 0) return `No pair of ${all} is seen to have changed`;
  if (changed.length > 1)
    return `${formatCount(changed.length)} pairs of ${all} changed by more than chance allows`;
  const [{ first, second }] = changed;
  return `One pair of ${all} changed by more than chance allows: sites ${names[first]} and ${names[second]}`;
}
