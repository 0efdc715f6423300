import { and, asc, eq, isNotNull, isNull } from 'drizzle-orm';
import type { DatasetFacets } from '../../../model/team/datasets/dataset-list';
import type { Database } from '../../db/client';
import { dataset, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Names offered in one list of a filter; a team with more searches for them. */
const MOST = 500;

/** Devices, firmware versions, groups and people that the team's datasets name, for the filters. */
export function listFacets(db: Database, actor: Actor): DatasetFacets {
  const here = and(mayWhere(actor, 'see', dataset.teamId), isNull(dataset.deletedAt));
  const values = (column: typeof dataset.device | typeof dataset.firmware | typeof dataset.group): string[] =>
    db
      .selectDistinct({ value: column })
      .from(dataset)
      .where(and(here, isNotNull(column)))
      .orderBy(asc(column))
      .limit(MOST)
      .all()
      .flatMap(({ value }) => value ?? []);
  const people = db
    .selectDistinct({ id: person.id, name: person.name })
    .from(dataset)
    .innerJoin(person, eq(person.id, dataset.createdBy))
    .where(here)
    .orderBy(asc(person.name))
    .limit(MOST)
    .all();
  return {
    devices: values(dataset.device),
    firmwares: values(dataset.firmware),
    groups: values(dataset.group),
    people
  };
}
