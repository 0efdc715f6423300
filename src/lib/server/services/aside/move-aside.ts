import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, siteMap, sweep } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';

/** What can be put aside by whoever made it; the word is the first half of its events. */
const TABLES = { dataset, sweep, 'site-map': siteMap };

export type Moved = { ok: true; name: string } | { ok: false; reason: 'unknown' };

/**
 * Takes one thing out of every list, where it can be brought back for 30 days, or brings it back. Experimenters
 * only their own; what is there already is unknown, so that nothing happens twice.
 */
export function moveAside(
  db: Database,
  actor: Actor,
  moved: { kind: keyof typeof TABLES; id: string; to: 'aside' | 'back' },
  now = Date.now()
): Moved {
  // The three tables have these columns in common; Drizzle has no type for a table that is one of several.
  const table = TABLES[moved.kind] as typeof sweep;
  const away = moved.to === 'aside';
  return db.transaction(
    (tx) => {
      const may = mayWhere(actor, away ? 'delete' : 'restore', table.teamId, table.createdBy);
      const done = tx
        .update(table)
        .set(away ? { deletedAt: now, deletedBy: actor.personId } : { deletedAt: null, deletedBy: null })
        .where(and(eq(table.id, moved.id), away ? isNull(table.deletedAt) : isNotNull(table.deletedAt), may))
        .returning({ name: table.name })
        .get() as { name: string } | undefined;
      if (!done) return { ok: false, reason: 'unknown' } as const;
      const action = `${moved.kind}.${away ? 'aside' : 'restore'}`;
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: moved.id };
      recordEvent(tx, { ...happening, action, detail: done }, now);
      return { ok: true, name: done.name } as const;
    },
    { behavior: 'immediate' }
  );
}
