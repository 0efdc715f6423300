import type { SharedThing } from '$lib/model/link/shown-by-link';
import { frozenConditionsSchema } from '$lib/model/team/frozen-conditions';
import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, report } from '../../db/schema';

/** All about the report of a link, as shownByLink takes it; undefined once it or its dataset was put aside. */
export function sharedReport(
  db: Pick<Database, 'select'>,
  id: string,
  team: string
): SharedThing | undefined {
  const found = db
    .select({
      madeBy: person.name,
      number: report.number,
      madeAt: report.createdAt,
      engineVersion: report.engineVersion,
      document: report.document,
      sha256: report.sha256,
      options: report.options,
      conditions: report.conditions,
      counts: dataset.counts
    })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(and(eq(report.id, id), isNull(report.deletedAt), isNull(dataset.deletedAt)))
    .get();
  return (
    found && {
      ...found,
      team: { name: team },
      options: JSON.parse(found.options) as DiagnoseOptions,
      conditions: frozenConditionsSchema.parse(JSON.parse(found.conditions)),
      counts: JSON.parse(found.counts) as CountData
    }
  );
}
