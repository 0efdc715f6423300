import type { DeviceCell } from '../../../model/team/devices/cell';
import type { Verdict } from '../../../stats/types';
import { and, asc, desc, eq, isNotNull, isNull, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { DeviceRow } from './find-device';

const newest = (column: 'id' | 'verdict') => sql<
  string | null
>`(select ${sql.identifier(column)} from report r
  where r.dataset_id = dataset.id and r.deleted_at is null order by r.number desc limit 1)`;
const waiting = sql<number>`exists (select 1 from job j where j.dataset_id = dataset.id
  and j.status in ('queued', 'running'))`;

/**
 * The cells of a device, group by firmware version: the newest dataset of each that is not put aside stands for it,
 * and older ones are named as superseded. Datasets without a firmware version are in no cell.
 *
 * @param firmware the cells of this version alone
 */
export function cellsOf(
  db: Pick<Database, 'select'>,
  device: Pick<DeviceRow, 'teamId' | 'name'>,
  firmware?: string
): DeviceCell[] {
  const rows = db
    .select({
      id: dataset.id,
      name: dataset.name,
      firmware: dataset.firmware,
      group: dataset.group,
      shots: dataset.shots,
      mean: dataset.mean,
      createdAt: dataset.createdAt,
      reportId: newest('id'),
      verdict: newest('verdict'),
      waits: waiting
    })
    .from(dataset)
    .where(
      and(
        eq(dataset.teamId, device.teamId),
        isNull(dataset.deletedAt),
        eq(dataset.device, device.name),
        firmware === undefined ? isNotNull(dataset.firmware) : eq(dataset.firmware, firmware)
      )
    )
    .orderBy(asc(dataset.firmware), asc(dataset.group), desc(dataset.createdAt), desc(dataset.id))
    .all();
  const cells: DeviceCell[] = [];
  for (const {
    id,
    name,
    firmware: version,
    group,
    shots,
    mean,
    createdAt,
    reportId,
    verdict,
    waits
  } of rows) {
    const last = cells.at(-1);
    if (last && last.firmware === version && last.group === group) last.superseded.push({ id, name });
    else
      cells.push({
        firmware: version!,
        group,
        dataset: { id, name, shots, mean, createdAt },
        report: reportId === null ? null : { id: reportId, verdict: verdict as Verdict },
        waits: waits === 1,
        superseded: []
      });
  }
  return cells;
}
