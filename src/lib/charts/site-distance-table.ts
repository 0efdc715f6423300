import type { SitesReport } from '$lib/stats/sites/sites-types';
import type { Table } from './table';

/** Mean correlation by distance. */
export const siteDistanceTable = ({ byDistance }: Pick<SitesReport, 'byDistance'>): Table => ({
  columns: [
    { title: 'distance', kind: 'whole' },
    { title: 'pairs', kind: 'whole' },
    { title: 'mean correlation', kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' }
  ],
  rows: byDistance.map(({ distance, pairs, value, low, high }) => [distance, pairs, value, low, high])
});
