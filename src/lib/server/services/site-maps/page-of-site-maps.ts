import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { onePage, type Paged } from '../paging/one-page';
import { siteMapColumns, type SiteMapEntry } from './site-map-columns';

export interface AskedSiteMaps {
  limit: number;
  after?: string;
  device?: string;
}

/** The team's maps of sites page by page, newest first; not those put aside. */
export function pageOfSiteMaps(db: Database, actor: Actor, asked: AskedSiteMaps): Paged<SiteMapEntry> {
  const mine = and(
    mayWhere(actor, 'see', siteMap.teamId),
    isNull(siteMap.deletedAt),
    asked.device === undefined ? undefined : eq(siteMap.device, asked.device)
  );
  return onePage({ at: siteMap.createdAt, id: siteMap.id }, asked, (where, order, limit) => {
    // Ids by the index first: a sort must not carry documents along.
    const ids = db
      .select({ id: siteMap.id })
      .from(siteMap)
      .where(and(mine, where))
      .orderBy(...order)
      .limit(limit)
      .all()
      .map(({ id }) => id);
    return db
      .select(siteMapColumns)
      .from(siteMap)
      .where(inArray(siteMap.id, ids))
      .orderBy(...order)
      .all();
  });
}
