import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { sweep } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import type { ImportContext } from './insert-dataset';
import type { ReadArchivedSweep } from './read-sweeps';

/** Adds a sweep of an archive: its document as it was, which still names its datasets by the ids they had. */
export function insertSweep(
  tx: Pick<Database, 'insert'>,
  { about, text }: ReadArchivedSweep,
  { teamId, personId, madeBy, now }: ImportContext
): void {
  const id = newId();
  const { name, notes, sha256, options, datasets, engineVersion } = about;
  tx.insert(sweep)
    .values({
      ...{ id, teamId, name, notes, sha256, engineVersion },
      document: text,
      options: JSON.stringify(options),
      datasets: JSON.stringify(datasets),
      createdBy: null,
      createdAt: Date.parse(about.createdAt)
    })
    .run();
  const detail = { name, madeBy: madeBy[about.file] ?? null };
  recordEvent(tx, { action: 'sweep.import', teamId, personId, thing: id, detail }, now);
}
