import { desc } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { outboxMessage } from '../../db/schema';
import { isLocal, readEnv, type Env } from '../../env';

/** Messages on the page; older ones stay in the database. */
const SHOWN = 100;

export type OutboxMessage = typeof outboxMessage.$inferSelect;

/**
 * Mail that was written but not sent, the newest first. Null outside local mode, and for anybody who does not ask from
 * this machine itself: it holds links that sign people in.
 *
 * @param client address of who asks
 */
export function outbox(db: Database, client: string, env: Env = readEnv()): OutboxMessage[] | null {
  if (!outboxIsOpen(client, env)) return null;
  return db.select().from(outboxMessage).orderBy(desc(outboxMessage.createdAt)).limit(SHOWN).all();
}

/** Whether there is an outbox page for who asks. */
export function outboxIsOpen(client: string, env: Env = readEnv()): boolean {
  return isLocal(env) && (/^127\./.test(client) || client === '0:0:0:0::/64');
}
