import { and, eq, gt, isNull } from 'drizzle-orm';
import { hashToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { mailedToken } from '../../db/schema';
import type { Purpose } from './mailed-purposes';

export type FindMailedToken =
  { ok: true; email: string } | { ok: false; reason: 'unknown' | 'used' | 'expired' };

/** Whether a link would work, and for whom, without using it: mail scanners open links, people press buttons. */
export function findMailedToken(
  db: Pick<Database, 'select'>,
  purpose: Purpose,
  token: string,
  now = Date.now()
): FindMailedToken {
  const found = db
    .select({ email: mailedToken.email, usedAt: mailedToken.usedAt, expiresAt: mailedToken.expiresAt })
    .from(mailedToken)
    .where(and(eq(mailedToken.tokenHash, hashToken(token)), eq(mailedToken.purpose, purpose)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  if (found.usedAt !== null) return { ok: false, reason: 'used' };
  if (found.expiresAt <= now) return { ok: false, reason: 'expired' };
  return { ok: true, email: found.email };
}

/**
 * Uses a link up, together with every other one of its kind to the same address. One statement decides, so that two
 * presses at once are one.
 */
export function useMailedToken(
  db: Pick<Database, 'select' | 'update'>,
  purpose: Purpose,
  token: string,
  now: number
): FindMailedToken {
  const used = db
    .update(mailedToken)
    .set({ usedAt: now })
    .where(
      and(
        eq(mailedToken.tokenHash, hashToken(token)),
        eq(mailedToken.purpose, purpose),
        isNull(mailedToken.usedAt),
        gt(mailedToken.expiresAt, now)
      )
    )
    .returning({ email: mailedToken.email })
    .get() as { email: string } | undefined;
  if (!used) {
    const why = findMailedToken(db, purpose, token, now);
    return why.ok ? { ok: false, reason: 'used' } : why;
  }
  db.update(mailedToken)
    .set({ usedAt: now })
    .where(
      and(eq(mailedToken.email, used.email), eq(mailedToken.purpose, purpose), isNull(mailedToken.usedAt))
    )
    .run();
  return { ok: true, email: used.email };
}
