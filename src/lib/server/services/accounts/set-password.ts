import { and, eq, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { mailedToken, person } from '../../db/schema';
import { recordEvent } from '../events/record-event';

/**
 * Writes a new password within a transaction. Every session of the person ends, and so does every link that waits in
 * their mail: whoever had one of those is why passwords get changed.
 */
export function setPassword(
  tx: Pick<Database, 'update' | 'insert'>,
  { personId, email, passwordHash }: { personId: string; email: string; passwordHash: string },
  by: 'mail' | 'account',
  now: number
): void {
  tx.update(person)
    .set({ passwordHash, sessionVersion: sql`${person.sessionVersion} + 1` })
    .where(eq(person.id, personId))
    .run();
  tx.update(mailedToken)
    .set({ usedAt: now })
    .where(and(eq(mailedToken.email, email), isNull(mailedToken.usedAt)))
    .run();
  recordEvent(tx, { action: 'person.password', personId, detail: { by } }, now);
}
