import { asc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { identity, person } from '../../db/schema';

export interface Account {
  email: string;
  name: string;
  hasPassword: boolean;
  identities: { issuer: string; subject: string; createdAt: number }[];
}

/** What the account page shows of who is signed in; null when they are gone since. */
export function account(db: Database, personId: string): Account | null {
  const found = db.select().from(person).where(eq(person.id, personId)).get();
  if (!found) return null;
  const identities = db
    .select({ issuer: identity.issuer, subject: identity.subject, createdAt: identity.createdAt })
    .from(identity)
    .where(eq(identity.personId, personId))
    .orderBy(asc(identity.createdAt))
    .all();
  return { email: found.email, name: found.name, hasPassword: found.passwordHash !== null, identities };
}
