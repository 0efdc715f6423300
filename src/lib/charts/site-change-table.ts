import type { MapsComparedReport } from '$lib/stats/sites/maps-compared';
import type { Table } from './table';

/** Every pair of two maps in full, the least likely by chance first. */
export const siteChangeTable = ({ names, pairs, alpha }: MapsComparedReport): Table => ({
  columns: [
    { title: 'site', kind: 'text' },
    { title: 'other site', kind: 'text' },
    { title: 'distance', kind: 'whole' },
    { title: 'correlation before', kind: 'number' },
    { title: 'correlation after', kind: 'number' },
    { title: 'p', kind: 'number' },
    { title: 'p, all pairs', kind: 'number' },
    { title: 'found', kind: 'text' }
  ],
  rows: pairs
    .toSorted((a, b) => a.pHolm - b.pHolm || a.p - b.p)
    .map(({ first, second, distance, earlier, later, p, pHolm }) => [
      names[first],
      names[second],
      distance,
      earlier,
      later,
      p,
      pHolm,
      pHolm <= alpha ? 'yes' : 'no'
    ])
});
