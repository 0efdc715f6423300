import { formatNumber } from '$lib/model/format-number';
import type { MappedPair, SitesReport } from '$lib/stats/sites/sites-types';

/** How far two sites are from each other. */
export const sayDistance = (distance: number): string =>
  distance === 1 ? 'neighbours' : `${distance} apart`;

/** A pair in one sentence: its sites, their distance, its correlation and how likely that is by chance among all pairs. */
export function sitePairWords(
  { names, alpha }: Pick<SitesReport, 'names' | 'alpha'>,
  { first, second, distance, correlation, low, high, pHolm }: MappedPair
): string {
  const ends =
    low === null || high === null
      ? ''
      : `, 95\u202f% interval ${formatNumber(low, 2)} to ${formatNumber(high, 2)}`;
  const found = pHolm <= alpha ? 'found among all pairs' : 'not found among all pairs';
  return `Sites ${names[first]} and ${names[second]}, ${sayDistance(distance)}: correlation ${formatNumber(correlation, 2)}${ends}; ${found}, p = ${formatNumber(pHolm, 2)}.`;
}
