import type { SharedSweep } from '$lib/model/link/sweep-by-link';
import { and, eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Database } from '../../db/client';
import { person, sweep } from '../../db/schema';

/** All about the sweep of a link, as sweepByLink takes it; undefined once it was put aside. */
export function sharedSweep(db: Pick<Database, 'select'>, id: string, team: string): SharedSweep | undefined {
  const found = db
    .select({
      name: sweep.name,
      notes: sweep.notes,
      madeBy: person.name,
      madeAt: sweep.createdAt,
      engineVersion: sweep.engineVersion,
      document: sweep.document,
      sha256: sweep.sha256,
      datasets: sweep.datasets
    })
    .from(sweep)
    .leftJoin(person, eq(person.id, sweep.createdBy))
    .where(and(eq(sweep.id, id), isNull(sweep.deletedAt)))
    .get();
  return (
    found && {
      ...found,
      team,
      whole: createHash('sha256').update(found.document).digest('hex') === found.sha256,
      datasets: JSON.parse(found.datasets) as SharedSweep['datasets']
    }
  );
}
