import { mapsCompared, type MapsComparedReport } from '../../../stats/sites/maps-compared';
import { BadInput } from '../../../stats/types';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { openSiteMap, type OpenedSiteMap } from './open-site-map';

export type CompareSiteMaps =
  | { ok: true; earlier: OpenedSiteMap; later: OpenedSiteMap; document: MapsComparedReport }
  /** One of them is not here, not of this team, or put aside. */
  | { ok: false; reason: 'unknown' }
  | { ok: false; reason: 'refused'; earlier: OpenedSiteMap; later: OpenedSiteMap; why: string };

/** What changed from one map of sites of the actor's team to another; nothing of it is kept. */
export function compareSiteMaps(db: Database, actor: Actor, before: string, after: string): CompareSiteMaps {
  const [one, other] = [openSiteMap(db, actor, before), openSiteMap(db, actor, after)];
  if (!one.ok || !other.ok) return { ok: false, reason: 'unknown' };
  const maps = { earlier: one.map, later: other.map };
  const refuse = (why: string) => ({ ok: false, reason: 'refused', ...maps, why }) as const;
  if (before === after) return refuse('A map cannot be compared with itself: choose two.');
  if (!one.document || !other.document)
    return refuse('The bytes of one of these maps no longer have the sha256 noted when it was made.');
  try {
    return { ok: true, ...maps, document: mapsCompared(one.document, other.document) };
  } catch (error) {
    if (!(error instanceof BadInput)) throw error;
    return refuse(error.reason);
  }
}
