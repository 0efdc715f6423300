import { and, eq } from 'drizzle-orm';
import { countsCsv } from '../../../model/exports/counts-csv';
import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { safeFileName } from './safe-file-name';

/** The counts of a dataset as a table that every program reads, and this one reads back to the same counts. */
export function csvOfDataset(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; name: string; text: string } | { ok: false; reason: 'unknown' } {
  const found = db
    .select({ name: dataset.name, counts: dataset.counts })
    .from(dataset)
    .where(and(eq(dataset.id, id), mayWhere(actor, 'see', dataset.teamId)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const counts = JSON.parse(found.counts) as CountData;
  return { ok: true, name: safeFileName(`${found.name}.csv`), text: countsCsv(counts) };
}
