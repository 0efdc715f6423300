import { and, eq, or } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { device } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import type { DeviceRow } from '../devices/find-device';

/** A device of the actor's team by its name or its id; a name goes before an id. */
export function findNamedDevice(db: Database, actor: Actor, named: string): DeviceRow | undefined {
  const found = db
    .select()
    .from(device)
    .where(and(or(eq(device.name, named), eq(device.id, named)), mayWhere(actor, 'see', device.teamId)))
    .all();
  return found.find(({ name }) => name === named) ?? found.at(0);
}
