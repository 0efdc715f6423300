import { judgePassword } from '$lib/model/account/judge-password';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person } from '../../db/schema';
import { forgiveAttempt, spendAttempt } from '../../auth/limits';
import { hashPassword, passwordFits } from '../../auth/password-hash';
import { setPassword } from './set-password';

export type ChangePassword =
  | { ok: true }
  | { ok: false; reason: 'weak'; why: string }
  | { ok: false; reason: 'wait'; seconds: number }
  /** The old password; also when there is none: those choose their first one by mail. */
  | { ok: false; reason: 'wrong' };

/** Changes the password of somebody signed in, who must know the old one: the session alone may be a stolen one. */
export async function changePassword(
  db: Database,
  personId: string,
  { old, password }: { old: string; password: string },
  client: string,
  now = Date.now()
): Promise<ChangePassword> {
  const found = db.select().from(person).where(eq(person.id, personId)).get();
  const attempt = { client, account: found?.email ?? personId };
  const spent = await spendAttempt('password', attempt);
  if (!spent.ok) return spent;
  if (!(await passwordFits(found?.passwordHash, old)) || !found) return { ok: false, reason: 'wrong' };
  await forgiveAttempt('password', attempt);
  const judged = judgePassword(password, [found.email, found.name, old]);
  if (!judged.ok) return { ok: false, reason: 'weak', why: judged.why };
  const passwordHash = await hashPassword(password);
  db.transaction((tx) => setPassword(tx, { personId, email: found.email, passwordHash }, 'account', now), {
    behavior: 'immediate'
  });
  return { ok: true };
}
