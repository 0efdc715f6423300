import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { csvCell } from './csv-cell';
import { datasetById } from './dataset-by-id';
import { safeFileName } from './safe-file-name';

/** The counts of a dataset as a table that every program reads, and this one reads back to the same counts. */
export function csvOfDataset(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; name: string; text: string } | { ok: false; reason: 'unknown' } {
  const found = datasetById(db, actor, id);
  if (!found.ok) return found;
  const { conditions, counts } = found.dataset;
  return { ok: true, name: safeFileName(`${conditions.name}.csv`), text: csvOfCounts(counts) };
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
