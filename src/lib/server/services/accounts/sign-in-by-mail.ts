import { eq, sql } from 'drizzle-orm';
import { insertPerson, nameOfEmail } from '../../auth/insert-person';
import type { Database } from '../../db/client';
import { person } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { useMailedToken } from './mailed-token';

export type SignInByMail =
  { ok: true; personId: string } | { ok: false; reason: 'unknown' | 'used' | 'expired' | 'disabled' };

/** Uses a mailed link up. Whoever has the address is shown to have it, and becomes a person if they were none. */
export function signInByMail(db: Database, token: string, now = Date.now()): SignInByMail {
  return db.transaction(
    (tx): SignInByMail => {
      const used = useMailedToken(tx, 'sign-in', token, now);
      if (!used.ok) return used;
      const { email } = used;
      const found = tx.select().from(person).where(eq(person.email, email)).get();
      if (found && found.disabledAt !== null) return { ok: false, reason: 'disabled' };
      const row = { email, name: nameOfEmail(email), passwordHash: null, verified: true };
      const personId = found?.id ?? insertPerson(tx, row, now)!.id;
      tx.update(person)
        .set({ emailVerifiedAt: sql`coalesce(${person.emailVerifiedAt}, ${now})` })
        .where(eq(person.id, personId))
        .run();
      if (!found) recordEvent(tx, { action: 'person.add', personId, detail: { by: 'mail' } }, now);
      recordEvent(tx, { action: 'person.sign-in', personId, detail: { by: 'mail' } }, now);
      return { ok: true, personId };
    },
    { behavior: 'immediate' }
  );
}
