import { and, count, desc, eq, inArray, isNull, sql } from 'drizzle-orm';
import type { SiteMapList, SiteMapRow } from '../../../model/team/site-maps/site-map-list';
import type { Database } from '../../db/client';
import { person, siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { siteMapColumns } from './site-map-columns';

const SIZE = 25;

/** One page of the team's maps of sites, newest first. A page behind the last one gives the last one. */
export function listSiteMaps(db: Database, actor: Actor, asked: number): SiteMapList {
  const here = and(mayWhere(actor, 'see', siteMap.teamId), isNull(siteMap.deletedAt));
  const total = db.select({ total: count() }).from(siteMap).where(here).get()?.total ?? 0;
  const page = Math.max(1, Math.min(asked, Math.ceil(total / SIZE)));
  // Ids first and lines afterwards: documents are long, and a sort must not carry them along.
  const ids = db
    .select({ id: siteMap.id })
    .from(siteMap)
    .where(here)
    .orderBy(desc(siteMap.createdAt), desc(sql`${siteMap}.rowid`))
    .limit(SIZE)
    .offset((page - 1) * SIZE)
    .all()
    .map(({ id }) => id);
  const lines = new Map(linesOf(db, ids).map((row) => [row.id, row]));
  return { rows: ids.flatMap((id) => lines.get(id) ?? []), total, all: total, page, size: SIZE };
}

function linesOf(db: Database, ids: string[]): SiteMapRow[] {
  const { id, name, sites, shots, device, firmware, group, statement, createdAt } = siteMapColumns;
  return db
    .select({ id, name, sites, shots, device, firmware, group, statement, by: person.name, createdAt })
    .from(siteMap)
    .leftJoin(person, eq(person.id, siteMap.createdBy))
    .where(inArray(siteMap.id, ids))
    .all();
}
