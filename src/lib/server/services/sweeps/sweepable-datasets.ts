import type { SweepFilter } from '$lib/model/team/sweeps/sweep-filter';
import { and, asc, eq, inArray, isNotNull, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Most datasets offered at once. */
const MOST = 500;

/** Datasets that state a time on the axis and fit a filter, by device and time, and the names the filter can ask for. */
export function sweepableDatasets(db: Database, actor: Actor, filter: SweepFilter) {
  const quench = filter.axis === 'quench-time';
  const [time, unit] = quench
    ? [dataset.quenchTime, dataset.quenchUnit]
    : [dataset.holdTime, dataset.holdUnit];
  const here = and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt), isNotNull(time));
  const wanted = and(
    here,
    filter.device ? eq(dataset.device, filter.device) : undefined,
    filter.firmware ? eq(dataset.firmware, filter.firmware) : undefined,
    filter.group ? eq(dataset.group, filter.group) : undefined,
    filter.unit ? eq(dataset.unit, filter.unit) : undefined,
    filter.datasets.length > 0 ? inArray(dataset.id, filter.datasets) : undefined
  );
  const rows = db
    .select({
      id: dataset.id,
      name: dataset.name,
      device: dataset.device,
      firmware: dataset.firmware,
      group: dataset.group,
      time,
      timeUnit: unit,
      unit: dataset.unit,
      shots: dataset.shots,
      mean: dataset.mean
    })
    .from(dataset)
    .where(wanted)
    .orderBy(asc(dataset.device), asc(dataset.firmware), asc(dataset.group), asc(time))
    .limit(MOST)
    .all();
  const names = (column: typeof dataset.device | typeof dataset.firmware | typeof dataset.group): string[] =>
    db
      .selectDistinct({ value: column })
      .from(dataset)
      .where(and(here, isNotNull(column)))
      .orderBy(asc(column))
      .limit(MOST)
      .all()
      .flatMap(({ value }) => value ?? []);
  return {
    rows,
    devices: names(dataset.device),
    firmwares: names(dataset.firmware),
    groups: names(dataset.group)
  };
}

export type SweepableRow = ReturnType<typeof sweepableDatasets>['rows'][number];
