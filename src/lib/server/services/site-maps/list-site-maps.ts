import type { SiteMapList } from '$lib/model/team/site-maps/site-map-list';
import { eq, inArray } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { newestPage } from '../paging/newest-page';
import { siteMapColumns } from './site-map-columns';

/** One page of the team's maps of sites, newest first. A page behind the last one gives the last one. */
export function listSiteMaps(db: Database, actor: Actor, asked: number): SiteMapList {
  const { id, name, sites, shots, device, firmware, group, statement, createdAt } = siteMapColumns;
  return newestPage(db, actor, siteMap, asked, (ids) =>
    db
      .select({ id, name, sites, shots, device, firmware, group, statement, by: person.name, createdAt })
      .from(siteMap)
      .leftJoin(person, eq(person.id, siteMap.createdBy))
      .where(inArray(siteMap.id, ids))
      .all()
  );
}
