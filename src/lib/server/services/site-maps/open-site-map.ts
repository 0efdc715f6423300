import { and, eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { SitesReport } from '../../../stats/sites/sites-types';
import type { Database } from '../../db/client';
import { originalFile, person, siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { siteMapColumns, type SiteMapEntry } from './site-map-columns';

export interface OpenedSiteMap extends SiteMapEntry {
  sha256: string;
  /** Of the document, bytes. */
  bytes: number;
  engineVersion: string;
  fileName: string;
  createdBy: string | null;
  by: string | null;
}

export type OpenSiteMap =
  /** `document` is null when the bytes no longer have their sha256. */
  | { ok: true; map: OpenedSiteMap; document: SitesReport | null }
  /** No such map, or none of this team, or put aside. */
  | { ok: false; reason: 'unknown' };

/** One map of sites of the actor's team, with what its page says of it. */
export function openSiteMap(db: Database, actor: Actor, id: string): OpenSiteMap {
  const row = db
    .select({
      ...siteMapColumns,
      text: siteMap.document,
      sha256: siteMap.sha256,
      engineVersion: siteMap.engineVersion,
      fileName: originalFile.name,
      createdBy: siteMap.createdBy,
      by: person.name
    })
    .from(siteMap)
    .innerJoin(originalFile, eq(originalFile.id, siteMap.fileId))
    .leftJoin(person, eq(person.id, siteMap.createdBy))
    .where(and(eq(siteMap.id, id), mayWhere(actor, 'see', siteMap.teamId), isNull(siteMap.deletedAt)))
    .get();
  if (!row) return { ok: false, reason: 'unknown' };
  const { text, ...map } = row;
  const whole = createHash('sha256').update(text).digest('hex') === map.sha256;
  const document = whole ? (JSON.parse(text) as SitesReport) : null;
  return { ok: true, map: { ...map, bytes: Buffer.byteLength(text) }, document };
}
