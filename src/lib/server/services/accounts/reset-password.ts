import { judgePassword } from '$lib/model/account/judge-password';
import { eq, sql } from 'drizzle-orm';
import { hashPassword } from '../../auth/password-hash';
import type { Database } from '../../db/client';
import { person } from '../../db/schema';
import { findMailedToken, useMailedToken } from './mailed-token';
import { setPassword } from './set-password';

export type ResetPassword =
  | { ok: true; personId: string }
  | { ok: false; reason: 'weak'; why: string }
  | { ok: false; reason: 'unknown' | 'used' | 'expired' | 'disabled' };

/** Sets a new password by a mailed link, which is used up only when the password will do. */
export async function resetPassword(
  db: Database,
  { token, password }: { token: string; password: string },
  now = Date.now()
): Promise<ResetPassword> {
  const would = findMailedToken(db, 'password', token, now);
  if (!would.ok) return would;
  const named = db.select({ name: person.name }).from(person).where(eq(person.email, would.email)).get();
  const judged = judgePassword(password, [would.email, named?.name ?? '']);
  if (!judged.ok) return { ok: false, reason: 'weak', why: judged.why };
  const passwordHash = await hashPassword(password);
  return db.transaction(
    (tx): ResetPassword => {
      const used = useMailedToken(tx, 'password', token, now);
      if (!used.ok) return used;
      const found = tx.select().from(person).where(eq(person.email, used.email)).get();
      if (!found) return { ok: false, reason: 'unknown' };
      if (found.disabledAt !== null) return { ok: false, reason: 'disabled' };
      tx.update(person)
        .set({ emailVerifiedAt: sql`coalesce(${person.emailVerifiedAt}, ${now})` })
        .where(eq(person.id, found.id))
        .run();
      setPassword(tx, { personId: found.id, email: found.email, passwordHash }, 'mail', now);
      return { ok: true, personId: found.id };
    },
    { behavior: 'immediate' }
  );
}
