import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { event, team, webhook, webhookDelivery } from '../../db/schema';
import { newerEvents } from '../events/newer-events';

/** Events read at a time for one webhook: a batch of a thousand diagnoses must not hold the database for long. */
const AT_A_TIME = 500;

/** Facts of an event that say too much: section and link of a remark could tell blind referees apart. */
const QUIET = /^remark\./;

/**
 * Turns what happened since the last look into messages that wait, for every webhook that does not rest. The messages
 * and the place reached are one transaction, so a crash neither loses nor doubles one. Who acted is never in a message:
 * referees may be hidden.
 *
 * @returns how many messages were added
 */
export function gatherDeliveries(db: Database, now = Date.now()): number {
  const awake = db.select({ id: webhook.id }).from(webhook).where(isNull(webhook.restingSince)).all();
  return awake.reduce((sum, { id }) => sum + gatherFor(db, id, now), 0);
}

function gatherFor(db: Database, webhookId: string, now: number): number {
  const newer = newerEvents(webhook.teamId, webhook.lastEvent);
  const of = and(eq(webhook.id, webhookId), isNull(webhook.restingSince));
  // Looked at first without a write, since most looks find nothing.
  const any = db.select({ id: event.id }).from(webhook).innerJoin(event, newer).where(of).limit(1).get();
  if (!any) return 0;
  return db.transaction(
    (tx) => {
      const rows = tx
        .select({
          id: event.id,
          at: event.at,
          action: event.action,
          thing: event.thing,
          detail: event.detail,
          actions: webhook.actions,
          slug: team.slug
        })
        .from(webhook)
        .innerJoin(event, newer)
        .innerJoin(team, eq(team.id, webhook.teamId))
        .where(of)
        .orderBy(asc(event.id))
        .limit(AT_A_TIME)
        .all();
      if (rows.length === 0) return 0;
      const wanted = rows.filter((row) => (JSON.parse(row.actions) as string[]).includes(row.action));
      for (const { id, at, action, thing, detail, slug } of wanted) {
        const facts: unknown = detail === null || QUIET.test(action) ? {} : JSON.parse(detail);
        const data = { event: id, team: slug, thing, facts };
        const body = JSON.stringify({ type: action, timestamp: new Date(at).toISOString(), data });
        const row = { id: newId(), webhookId, eventId: id, action, body, createdAt: now, dueAt: now };
        tx.insert(webhookDelivery)
          .values({ ...row, status: 'waiting' })
          .onConflictDoNothing()
          .run();
      }
      const lastEvent = rows[rows.length - 1].id;
      tx.update(webhook).set({ lastEvent }).where(eq(webhook.id, webhookId)).run();
      return wanted.length;
    },
    { behavior: 'immediate' }
  );
}
