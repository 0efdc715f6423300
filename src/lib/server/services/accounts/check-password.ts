import { eq } from 'drizzle-orm';
import { normalEmail } from '../../auth/normal-email';
import { passwordFits } from '../../auth/password-hash';
import type { Database } from '../../db/client';
import { person } from '../../db/schema';
import { recordEvent } from '../events/record-event';

export type CheckPassword =
  | { ok: true; personId: string }
  /** `wrong`: the password, the address or both; which is not told, nor by the time it takes. */
  | { ok: false; reason: 'wrong' };

/** Whose address and password these are. */
export async function checkPassword(
  db: Database,
  { email, password }: { email: string; password: string },
  now = Date.now()
): Promise<CheckPassword> {
  const found = db
    .select({ id: person.id, hash: person.passwordHash, disabledAt: person.disabledAt })
    .from(person)
    .where(eq(person.email, normalEmail(email)))
    .get();
  const fits = await passwordFits(found?.hash, password);
  if (!found || !fits || found.disabledAt !== null) return { ok: false, reason: 'wrong' };
  recordEvent(db, { action: 'person.sign-in', personId: found.id, detail: { by: 'password' } }, now);
  return { ok: true, personId: found.id };
}
