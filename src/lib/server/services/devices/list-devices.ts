import type { DeviceLine } from '../../../model/team/devices/device';
import { asc, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { device } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** The devices of the team by name, each with its number of versions and datasets; datasets put aside are not counted. */
export function listDevices(db: Database, actor: Actor): DeviceLine[] {
  // Columns of the outer row are written out: drizzle leaves their table away where there is one alone.
  return db
    .select({
      id: device.id,
      name: device.name,
      versions: sql<number>`(select count(*) from firmware_version v where v.device_id = device.id)`,
      datasets: sql<number>`(select count(*) from dataset d where d.team_id = device.team_id
        and d.deleted_at is null and d.device = device.name)`,
      newest: sql<string | null>`(select v.name from firmware_version v where v.device_id = device.id
        order by v.place desc, v.created_at desc limit 1)`
    })
    .from(device)
    .where(mayWhere(actor, 'see', device.teamId))
    .orderBy(asc(sql`lower(${device.name})`), asc(device.id))
    .all();
}
