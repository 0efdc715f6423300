import { and, eq } from 'drizzle-orm';
import type { Database } from '../db/client';
import { identity, person } from '../db/schema';
import { recordEvent } from '../services/events/record-event';
import { insertPerson, nameOfEmail } from './insert-person';
import { normalEmail } from './normal-email';

/** Somebody as an issuer vouches for them. */
export interface Vouched {
  issuer: string;
  subject: string;
  email: string | null;
  /** The issuer says that the address was shown to be theirs. */
  emailVerified: boolean;
  name: string | null;
}

export type Identify =
  | { ok: true; personId: string }
  /**
   * `disabled`; `unverified`: unknown here, and the issuer does not vouch for an address; `other`: it is somebody
   * else's identity already.
   */
  | { ok: false; reason: 'disabled' | 'unverified' | 'other' };

/**
 * Who somebody from an issuer is here. Known by (issuer, subject), as addresses change hands. Seen for the first time
 * they are tied to whoever is signed in, else to the person with their address or to a new one, and that only when the
 * issuer says that the address is theirs: anybody can type another's address into an issuer that does not check.
 *
 * @param signedIn who is signed in in this browser, and so is tying the identity to their account
 */
export function identify(
  db: Database,
  vouched: Vouched,
  signedIn: string | null,
  now = Date.now()
): Identify {
  const { issuer, subject } = vouched;
  return db.transaction(
    (tx): Identify => {
      const enter = (personId: string): Identify => {
        const found = tx
          .select({ disabledAt: person.disabledAt })
          .from(person)
          .where(eq(person.id, personId))
          .get();
        if (found?.disabledAt !== null) return { ok: false, reason: 'disabled' };
        recordEvent(tx, { action: 'person.sign-in', personId, detail: { by: 'issuer' } }, now);
        return { ok: true, personId };
      };
      const tie = (personId: string): Identify => {
        tx.insert(identity).values({ issuer, subject, personId, createdAt: now }).run();
        recordEvent(tx, { action: 'person.identity-tie', personId, detail: { issuer } }, now);
        return enter(personId);
      };

      const known = tx
        .select({ personId: identity.personId })
        .from(identity)
        .where(and(eq(identity.issuer, issuer), eq(identity.subject, subject)))
        .get();
      if (known && signedIn !== null && known.personId !== signedIn) return { ok: false, reason: 'other' };
      if (known) return enter(known.personId);
      if (signedIn !== null) return tie(signedIn);
      if (vouched.email === null || !vouched.emailVerified) return { ok: false, reason: 'unverified' };

      const email = normalEmail(vouched.email);
      const found = tx.select().from(person).where(eq(person.email, email)).get();
      if (found) {
        if (found.disabledAt !== null) return { ok: false, reason: 'disabled' };
        if (found.emailVerifiedAt === null)
          tx.update(person).set({ emailVerifiedAt: now }).where(eq(person.id, found.id)).run();
        return tie(found.id);
      }
      const name = vouched.name?.trim().slice(0, 80) || nameOfEmail(email);
      const made = insertPerson(tx, { email, name, passwordHash: null, verified: true }, now)!;
      recordEvent(tx, { action: 'person.add', personId: made.id, detail: { by: 'issuer' } }, now);
      return tie(made.id);
    },
    { behavior: 'immediate' }
  );
}
