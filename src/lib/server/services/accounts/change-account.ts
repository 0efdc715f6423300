import { and, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { identity, person } from '../../db/schema';
import { recordEvent } from '../events/record-event';

/** Gives a person another name. What they signed before keeps the old one. */
export function renamePerson(db: Database, personId: string, name: string, now = Date.now()): void {
  db.transaction((tx) => {
    tx.update(person).set({ name }).where(eq(person.id, personId)).run();
    recordEvent(tx, { action: 'person.name', personId }, now);
  });
}

/** Ends every session of a person, in this browser too. */
export function signOutEverywhere(db: Database, personId: string, now = Date.now()): void {
  db.transaction((tx) => {
    tx.update(person)
      .set({ sessionVersion: sql`${person.sessionVersion} + 1` })
      .where(eq(person.id, personId))
      .run();
    recordEvent(tx, { action: 'person.sign-out-everywhere', personId }, now);
  });
}

/** Unties an identity at an issuer from the person who asks; one that is not theirs is left alone. */
export function untieIdentity(
  db: Database,
  personId: string,
  { issuer, subject }: { issuer: string; subject: string },
  now = Date.now()
): void {
  db.transaction((tx) => {
    const { changes } = tx
      .delete(identity)
      .where(and(eq(identity.personId, personId), eq(identity.issuer, issuer), eq(identity.subject, subject)))
      .run();
    if (changes > 0) recordEvent(tx, { action: 'person.identity-untie', personId, detail: { issuer } }, now);
  });
}
