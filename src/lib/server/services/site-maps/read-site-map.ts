import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { siteMapColumns, type SiteMapEntry } from './site-map-columns';

export type ReadSiteMap =
  /** `text` is the document, byte for byte as it was stored. */
  | { ok: true; map: SiteMapEntry; text: string }
  /** No such map, or none of this team, or put aside. */
  | { ok: false; reason: 'unknown' };

/** One map of sites of the actor's team. */
export function readSiteMap(db: Database, actor: Actor, id: string): ReadSiteMap {
  const row = db
    .select({ ...siteMapColumns, text: siteMap.document })
    .from(siteMap)
    .where(and(eq(siteMap.id, id), mayWhere(actor, 'see', siteMap.teamId), isNull(siteMap.deletedAt)))
    .get();
  if (!row) return { ok: false, reason: 'unknown' };
  const { text, ...map } = row;
  return { ok: true, map, text };
}
