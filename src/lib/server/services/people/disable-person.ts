import { and, eq, isNull, sql } from 'drizzle-orm';
import { normalEmail } from '../../auth/normal-email';
import type { Database } from '../../db/client';
import { apiToken, person } from '../../db/schema';
import { recordEvent } from '../events/record-event';

export type ChangePerson = { ok: true; changed: boolean } | { ok: false; reason: 'unknown' };

/** Closes an account: its sessions and the tokens of its scripts end at once, and nobody gets in by any way. */
export function disablePerson(db: Database, email: string, now = Date.now()): ChangePerson {
  return change(db, email, true, now);
}

/** Opens an account again; sessions and tokens from before stay ended. */
export function enablePerson(db: Database, email: string, now = Date.now()): ChangePerson {
  return change(db, email, false, now);
}

function change(db: Database, email: string, disable: boolean, now: number): ChangePerson {
  return db.transaction(
    (tx): ChangePerson => {
      const found = tx
        .select()
        .from(person)
        .where(eq(person.email, normalEmail(email)))
        .get();
      if (!found) return { ok: false, reason: 'unknown' };
      if ((found.disabledAt !== null) === disable) return { ok: true, changed: false };
      tx.update(person)
        .set({ disabledAt: disable ? now : null, sessionVersion: sql`${person.sessionVersion} + 1` })
        .where(eq(person.id, found.id))
        .run();
      if (disable)
        tx.update(apiToken)
          .set({ revokedAt: now })
          .where(and(eq(apiToken.createdBy, found.id), isNull(apiToken.revokedAt)))
          .run();
      recordEvent(tx, { action: disable ? 'person.disable' : 'person.enable', thing: found.id }, now);
      return { ok: true, changed: true };
    },
    { behavior: 'immediate' }
  );
}
