import type { Database } from '../db/client';
import { insertPerson } from './insert-person';
import { hashPassword } from './password-hash';
import type { Person } from './person';

export interface NewPerson {
  email: string;
  name: string;
  /** Left out: comes by mailed link or from an institution, until one is chosen. */
  password?: string;
  /** The address was shown to be theirs. */
  verified?: boolean;
}

/** Adds somebody who can sign in. The strength of the password is for the caller to judge. */
export async function makePerson(
  db: Database,
  { email, name, password, verified = false }: NewPerson,
  now = Date.now()
): Promise<{ ok: true; person: Person } | { ok: false; reason: 'taken' }> {
  const passwordHash = password === undefined ? null : await hashPassword(password);
  const made = insertPerson(db, { email, name, passwordHash, verified }, now);
  return made ? { ok: true, person: made } : { ok: false, reason: 'taken' };
}
