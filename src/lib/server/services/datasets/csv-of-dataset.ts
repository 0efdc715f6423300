import { and, eq } from 'drizzle-orm';
import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { csvCell } from './csv-cell';
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
  return { ok: true, name: safeFileName(`${found.name}.csv`), text: csvOfCounts(counts) };
}

function csvOfCounts(data: CountData): string {
  const rows: string[] = [];
  if (data.kind === 'histogram') {
    rows.push('count,shots', ...data.counts.map(([count, shots]) => `${count},${shots}`));
    if (data.lump) rows.push(`${data.lump.from}+,${data.lump.shots}`);
  } else if (data.batches) {
    const { batches } = data;
    rows.push('shot,batch,count');
    for (const [i, count] of data.shots.entries()) rows.push(`${i + 1},${csvCell(batches[i])},${count}`);
  } else rows.push('count', ...Array.from(data.shots, String));
  return rows.join('\r\n') + '\r\n';
}
