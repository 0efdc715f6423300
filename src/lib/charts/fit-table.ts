import type { Diagnosis } from '$lib/stats/types';
import { intervalsTable } from './intervals-table';
import type { Table } from './table';

/** How far the best law lies from the counts, by every measure of the document; nats are a shot's. */
export const fitTable = ({ fit }: Diagnosis): Table =>
  intervalsTable('quantity', [
    ['divergence, nats', fit.divergence],
    ['floor, nats', fit.floor],
    ['divergence, chance taken off, nats', fit.divergenceInterval],
    ['G²', fit.gSquared],
    ['shots that make it noticeable', fit.shotsToNotice]
  ]);
