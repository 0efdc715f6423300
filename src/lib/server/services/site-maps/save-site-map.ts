import { and, eq, isNull } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import { engineVersion } from '../../../stats/engine-version';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { siteMap } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { mayInTeam } from '../datasets/may-in-team';
import { storeFile } from '../datasets/store-file';
import { recordEvent } from '../events/record-event';
import { insertSiteCounts } from './insert-site-counts';
import { readSiteFile, type ReadSiteFile } from './read-site-file';
import type { SiteMapRequest } from './site-map-request';

export type SavedSiteMap =
  | { ok: true; id: string }
  | { ok: false; reason: 'not-allowed' }
  | Extract<ReadSiteFile, { ok: false }>
  /** The same map of the same bytes is there; nothing was saved. */
  | { ok: false; reason: 'already-there'; already: { id: string; name: string }[] };

/**
 * Keeps a file of site-resolved shots, its map, and its counts of excited sites as a dataset (of kinks too, where asked),
 * all or none. A file that cannot be read is not kept.
 */
export function saveSiteMap(
  db: Database,
  actor: Actor,
  asked: SiteMapRequest,
  now = Date.now()
): SavedSiteMap {
  if (!mayInTeam(db, actor, 'upload')) return { ok: false, reason: 'not-allowed' };
  const read = readSiteFile(asked.bytes, asked.options);
  if (!read.ok) return read;
  const { input, report } = read;
  const stored = storeFile(db, actor, { name: asked.fileName, bytes: asked.bytes }, now);
  if (!stored.ok) return { ok: false, reason: stored.reason };
  const fileId = stored.file.id;
  const text = `${JSON.stringify(report)}\n`;
  const sha256 = createHash('sha256').update(text).digest('hex');
  return db.transaction(
    (tx): SavedSiteMap => {
      if (!mayInTeam(tx, actor, 'upload')) return { ok: false, reason: 'not-allowed' };
      const already = tx
        .select({ id: siteMap.id, name: siteMap.name })
        .from(siteMap)
        .where(
          and(
            eq(siteMap.teamId, actor.teamId),
            isNull(siteMap.deletedAt),
            eq(siteMap.fileId, fileId),
            eq(siteMap.sha256, sha256)
          )
        )
        .all();
      if (already.length > 0) return { ok: false, reason: 'already-there', already };
      const id = newId();
      const { geometry, alpha } = report;
      const { name, device, firmware, group } = asked;
      const from = { name, device, firmware, group, fileId };
      const bonds = geometry === 'ring' ? 'ring-bonds' : 'open-bonds';
      tx.insert(siteMap)
        .values({
          ...from,
          id,
          teamId: actor.teamId,
          countsId: insertSiteCounts(tx, actor, from, input, 'sites', now),
          kinksId: asked.keepsKinks ? insertSiteCounts(tx, actor, from, input, bonds, now) : null,
          geometry,
          sites: input.names.length,
          shots: input.shots.length,
          alpha,
          document: text,
          sha256,
          engineVersion,
          createdBy: actor.personId,
          createdAt: now
        })
        .run();
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id };
      recordEvent(tx, { ...happening, action: 'site-map.make', detail: { name, ...scriptOf(actor) } }, now);
      return { ok: true, id };
    },
    { behavior: 'immediate' }
  );
}
