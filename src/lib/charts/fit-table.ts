import { formatCount } from '$lib/model/format-number';
import type { Diagnosis } from '$lib/stats/types';
import { intervalsTable } from './intervals-table';
import type { Table } from './table';

/** How far the best law lies from the counts, by every measure of the document; nats are a shot's. */
export function fitTable({ fit }: Diagnosis): Table {
  const table = intervalsTable('quantity', [
    ['divergence, nats', fit.divergence],
    ['floor, nats', fit.floor],
    ['divergence, chance taken off, nats', fit.divergenceInterval],
    ['G²', fit.gSquared]
  ]);
  // A whole number of shots, among others that have decimals.
  const notice = fit.shotsToNotice === null ? null : formatCount(fit.shotsToNotice);
  table.rows.push(['shots that make it noticeable', notice, null, null]);
  return table;
}
