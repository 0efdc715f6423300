import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../db/client';
import { person } from '../db/schema';
import type { Person } from './person';

/**
 * Whom a session belongs to, or null when it has ended: the person is gone or disabled, or the version it was made
 * with is not the person's any more (password changed, signed out everywhere).
 */
export function sessionPerson(db: Database, personId: string, version: number): Person | null {
  const found = db
    .select({ id: person.id, email: person.email, name: person.name })
    .from(person)
    .where(and(eq(person.id, personId), eq(person.sessionVersion, version), isNull(person.disabledAt)))
    .get();
  return found ?? null;
}

/** The version that a session made now holds; null when the person may not sign in. */
export function sessionVersion(db: Database, personId: string): number | null {
  const found = db
    .select({ version: person.sessionVersion })
    .from(person)
    .where(and(eq(person.id, personId), isNull(person.disabledAt)))
    .get();
  return found?.version ?? null;
}
