import type { Database } from '../db/client';
import { newId } from '../db/new-id';
import { person } from '../db/schema';
import { normalEmail } from './normal-email';
import type { Person } from './person';

export interface PersonRow {
  email: string;
  name: string;
  passwordHash: string | null;
  /** The address was shown to be theirs. */
  verified: boolean;
}

/** Adds a person within a transaction; null when the address is somebody's already. */
export function insertPerson(
  db: Pick<Database, 'insert'>,
  { email, name, passwordHash, verified }: PersonRow,
  now: number
): Person | null {
  const made = { id: newId(), email: normalEmail(email), name };
  const { changes } = db
    .insert(person)
    .values({ ...made, passwordHash, emailVerifiedAt: verified ? now : null, createdAt: now })
    .onConflictDoNothing({ target: person.email })
    .run();
  return changes === 1 ? made : null;
}

/** What to call somebody of whom only the address is known; they can change it. */
export const nameOfEmail = (email: string): string => normalEmail(email).split('@')[0].slice(0, 80);
