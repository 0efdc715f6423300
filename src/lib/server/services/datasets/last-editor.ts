import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event, person } from '../../db/schema';

/** Name of who last changed a dataset's conditions; null when that person is gone. */
export function lastEditor(db: Pick<Database, 'select'>, teamId: string, id: string): string | null {
  const found = db
    .select({ name: person.name })
    .from(event)
    .leftJoin(person, eq(person.id, event.personId))
    .where(
      and(
        eq(event.teamId, teamId),
        eq(event.thing, id),
        inArray(event.action, ['dataset.edit', 'dataset.bulk-edit'])
      )
    )
    .orderBy(desc(event.id))
    .limit(1)
    .get();
  return found?.name ?? null;
}
