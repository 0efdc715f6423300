import { and, eq } from 'drizzle-orm';
import type { Action } from '../../access/actions';
import type { Database } from '../../db/client';
import { device } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export type DeviceRow = typeof device.$inferSelect;

/** The row of a device, where the actor may do that with it. */
export function findDevice(
  db: Pick<Database, 'select'>,
  actor: Actor,
  id: string,
  action: Action
): DeviceRow | undefined {
  return db
    .select()
    .from(device)
    .where(and(eq(device.id, id), mayWhere(actor, action, device.teamId)))
    .get();
}
