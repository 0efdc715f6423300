import { and, desc, eq, isNull, ne, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import type { SiteMapEntry } from './site-map-columns';

/** Maps offered at most. */
const MOST = 100;

export type ComparableMap = Pick<SiteMapEntry, 'id' | 'name' | 'device' | 'firmware' | 'group' | 'createdAt'>;

/** Other maps of as many sites and the same geometry, those of the same device first, then the newest. */
export function comparableMaps(
  db: Database,
  actor: Actor,
  { id, sites, geometry, device }: Pick<SiteMapEntry, 'id' | 'sites' | 'geometry' | 'device'>
): ComparableMap[] {
  const { name, firmware, group, createdAt } = siteMap;
  return db
    .select({ id: siteMap.id, name, device: siteMap.device, firmware, group, createdAt })
    .from(siteMap)
    .where(
      and(
        mayWhere(actor, 'see', siteMap.teamId),
        isNull(siteMap.deletedAt),
        eq(siteMap.sites, sites),
        eq(siteMap.geometry, geometry),
        ne(siteMap.id, id)
      )
    )
    .orderBy(desc(sql`${siteMap.device} is ${device}`), desc(siteMap.createdAt), siteMap.id)
    .limit(MOST)
    .all();
}
