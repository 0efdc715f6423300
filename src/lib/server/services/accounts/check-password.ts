import { eq } from 'drizzle-orm';
import { forgiveAttempt, spendAttempt } from '../../auth/limits';
import { normalEmail } from '../../auth/normal-email';
import { passwordFits } from '../../auth/password-hash';
import type { Database } from '../../db/client';
import { person } from '../../db/schema';
import { recordEvent } from '../events/record-event';

export type CheckPassword =
  | { ok: true; personId: string }
  /** `wrong`: the password, the address or both; which is not told, nor by the time it takes. */
  | { ok: false; reason: 'wrong' }
  | { ok: false; reason: 'wait'; seconds: number };

/**
 * Whose address and password these are.
 *
 * @param client where the attempt comes from, as clientOf says
 */
export async function checkPassword(
  db: Database,
  { email, password }: { email: string; password: string },
  client: string,
  now = Date.now()
): Promise<CheckPassword> {
  const attempt = { client, account: normalEmail(email) };
  const spent = await spendAttempt('password', attempt);
  if (!spent.ok) return spent;
  const found = db
    .select({ id: person.id, hash: person.passwordHash, disabledAt: person.disabledAt })
    .from(person)
    .where(eq(person.email, attempt.account))
    .get();
  const fits = await passwordFits(found?.hash, password);
  if (!found || !fits || found.disabledAt !== null) {
    if (found) recordEvent(db, { action: 'person.sign-in-failed', personId: found.id }, now);
    return { ok: false, reason: 'wrong' };
  }
  await forgiveAttempt('password', attempt);
  recordEvent(db, { action: 'person.sign-in', personId: found.id, detail: { by: 'password' } }, now);
  return { ok: true, personId: found.id };
}
