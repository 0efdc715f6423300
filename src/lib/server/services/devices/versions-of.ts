import type { DeviceVersion } from '../../../model/team/devices/device';
import { asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, firmwareVersion } from '../../db/schema';
import type { DeviceRow } from './find-device';

/**
 * The firmware versions of a device in its order, each with how many datasets name it and when the last came. What was
 * put aside counts apart: it still keeps its version from being removed.
 */
export function versionsOf(db: Pick<Database, 'select'>, { id, teamId, name }: DeviceRow): DeviceVersion[] {
  const taken = db
    .select({
      firmware: dataset.firmware,
      datasets: sql<number>`sum(${dataset.deletedAt} is null)`,
      aside: sql<number>`sum(${dataset.deletedAt} is not null)`,
      last: sql<number | null>`max(case when ${dataset.deletedAt} is null then ${dataset.createdAt} end)`
    })
    .from(dataset)
    .where(sql`${dataset.teamId} = ${teamId} and ${dataset.device} = ${name}`)
    .groupBy(dataset.firmware)
    .all();
  const of = new Map(taken.map((row) => [row.firmware, row]));
  return db
    .select()
    .from(firmwareVersion)
    .where(eq(firmwareVersion.deviceId, id))
    .orderBy(asc(firmwareVersion.place), asc(firmwareVersion.createdAt), asc(firmwareVersion.id))
    .all()
    .map((row) => ({
      id: row.id,
      name: row.name,
      notes: row.notes,
      datasets: of.get(row.name)?.datasets ?? 0,
      aside: of.get(row.name)?.aside ?? 0,
      last: of.get(row.name)?.last ?? null
    }));
}
