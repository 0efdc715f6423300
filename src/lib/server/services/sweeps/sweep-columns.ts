import type { SweepRow } from '$lib/model/team/sweeps/sweep-list';
import { sql } from 'drizzle-orm';
import { person, sweep } from '../../db/schema';

/** What a list says of a sweep; asked for together with who made it. */
export const sweepColumns = {
  id: sweep.id,
  name: sweep.name,
  axis: sql<SweepRow['axis']>`json_extract(${sweep.options}, '$.axis')`,
  datasets: sql<number>`json_array_length(${sweep.datasets})`,
  statement: sql<string>`json_extract(${sweep.document}, '$.statement')`,
  by: person.name,
  createdAt: sweep.createdAt
};
