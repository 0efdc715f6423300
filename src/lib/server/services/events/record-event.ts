import type { Database } from '../../db/client';
import { event } from '../../db/schema';

/** What happened: ids and plain facts, never tokens, passwords or counts. */
export interface Happening {
  action: string;
  teamId?: string | null;
  personId?: string | null;
  linkId?: string | null;
  thing?: string | null;
  detail?: Record<string, string | number | boolean | null>;
}

/** Adds a line to the events, which are never changed. Call it in the transaction of what it tells. */
export function recordEvent(db: Pick<Database, 'insert'>, happening: Happening, at = Date.now()): void {
  db.insert(event)
    .values({
      at,
      action: happening.action,
      teamId: happening.teamId ?? null,
      personId: happening.personId ?? null,
      linkId: happening.linkId ?? null,
      thing: happening.thing ?? null,
      detail: happening.detail ? JSON.stringify(happening.detail) : null
    })
    .run();
}
