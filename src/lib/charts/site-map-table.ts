import type { SitesReport } from '$lib/stats/sites/sites-types';
import type { Table } from './table';

/** Every pair of a map in full, the least likely by chance first. */
export const siteMapTable = ({ names, pairs, alpha }: SitesReport): Table => ({
  columns: [
    { title: 'site', kind: 'text' },
    { title: 'other site', kind: 'text' },
    { title: 'distance', kind: 'whole' },
    { title: 'shots with both', kind: 'whole' },
    { title: 'correlation', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    { title: 'p', kind: 'number' },
    { title: 'p, all pairs', kind: 'number' },
    { title: 'share of false finds', kind: 'number' },
    { title: 'found', kind: 'text' }
  ],
  rows: pairs
    .toSorted((a, b) => a.pHolm - b.pHolm || a.p - b.p)
    .map((pair) => [
      names[pair.first],
      names[pair.second],
      pair.distance,
      pair.together,
      pair.correlation,
      pair.low,
      pair.high,
      pair.p,
      pair.pHolm,
      pair.pFalseShare,
      pair.pHolm <= alpha ? 'yes' : 'no'
    ])
});
