import type { DeviceEntry } from '../../../model/team/devices/device';
import { and, count, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { findDevice } from './find-device';
import { versionsOf } from './versions-of';

/** A device of the team with its versions in order. */
export function readDevice(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; device: DeviceEntry } | { ok: false; reason: 'unknown' } {
  const found = findDevice(db, actor, id, 'see');
  if (!found) return { ok: false, reason: 'unknown' };
  const { name, notes, version } = found;
  const here = and(
    eq(dataset.teamId, actor.teamId),
    isNull(dataset.deletedAt),
    eq(dataset.device, name),
    isNull(dataset.firmware)
  );
  const unversioned = db.select({ n: count() }).from(dataset).where(here).get()?.n ?? 0;
  return { ok: true, device: { id, name, notes, version, unversioned, versions: versionsOf(db, found) } };
}
