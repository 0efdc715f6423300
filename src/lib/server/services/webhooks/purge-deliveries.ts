import { lte } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { webhookDelivery } from '../../db/schema';

/** How long it is kept what came of a message: 30 days after its end. */
const KEPT = 30 * 86_400_000;

/** Removes messages that ended 30 days ago; those that wait have no end and stay. */
export function purgeDeliveries(db: Database, now = Date.now()): number {
  return db
    .delete(webhookDelivery)
    .where(lte(webhookDelivery.endedAt, now - KEPT))
    .run().changes;
}
