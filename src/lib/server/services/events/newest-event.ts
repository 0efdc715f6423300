import { max } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event } from '../../db/schema';

/** Id of the last event of all teams; 0 when there is none. What happens from now on has a higher one. */
export const newestEvent = (db: Pick<Database, 'select'>): number =>
  db
    .select({ id: max(event.id) })
    .from(event)
    .get()?.id ?? 0;
