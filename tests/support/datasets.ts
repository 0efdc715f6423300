import type { Database } from '$lib/server/db/client';
import { newId } from '$lib/server/db/new-id';
import { dataset, originalFile, report } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';

type DatasetInsert = typeof dataset.$inferInsert;

/** A dataset row of an actor's team with a file of its own; counts are invented: 0 nine times, 1 once. */
export function makeDataset(db: Database, actor: Actor, more: Partial<DatasetInsert> = {}): string {
  const id = newId();
  const file = {
    id: newId(),
    teamId: actor.teamId,
    name: 'made.csv',
    sha256: newId(),
    size: 8,
    bytes: Buffer.from('0,9\n1,1\n'),
    createdAt: 1
  };
  db.insert(originalFile).values(file).run();
  db.insert(dataset)
    .values({
      id,
      teamId: actor.teamId,
      name: `made ${id.slice(0, 4)}`,
      fileId: file.id,
      reading: '{}',
      counts: '{"kind":"histogram","counts":[[0,9],[1,1]],"lump":null}',
      kind: 'histogram',
      digest: `sha256:${id}`,
      shots: 10,
      mean: 0.1,
      largest: 1,
      geometry: 'sites',
      unit: 'defect',
      createdBy: actor.personId,
      createdAt: 1,
      updatedAt: 1,
      ...more
    })
    .run();
  return id;
}

/** A report row that nobody computed: only its verdict and number matter. */
export function makeReport(
  db: Database,
  actor: Actor,
  datasetId: string,
  more: Partial<typeof report.$inferInsert> = {}
): string {
  const id = newId();
  db.insert(report)
    .values({
      id,
      teamId: actor.teamId,
      datasetId,
      number: 1,
      document: '{}',
      sha256: 'none',
      options: '{}',
      engineVersion: 'none',
      verdict: 'undecided',
      conditions: '{}',
      createdBy: actor.personId,
      createdAt: 1,
      ...more
    })
    .run();
  return id;
}
