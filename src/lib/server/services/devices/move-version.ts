import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { device, firmwareVersion } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';
import { findDevice } from './find-device';
import { versionsOf } from './versions-of';

export type MovedVersion =
  | { ok: true; name: string; version: number }
  /** `stale`: somebody changed the device since the page was opened. `no-way`: it is first or last already. */
  | { ok: false; reason: 'unknown' | 'stale' | 'no-way' };

/**
 * Moves a firmware version one place earlier or later in the order of its device, if the order still is as the editor
 * saw it.
 *
 * @param move.version of the device, as the page showed it
 */
export function moveVersion(
  db: Database,
  actor: Actor,
  deviceId: string,
  move: { versionId: string; by: -1 | 1; version: number },
  now = Date.now()
): MovedVersion {
  return db.transaction(
    (tx): MovedVersion => {
      const found = findDevice(tx, actor, deviceId, 'edit');
      const order = found ? versionsOf(tx, found) : [];
      const from = order.findIndex(({ id }) => id === move.versionId);
      if (!found || from < 0) return { ok: false, reason: 'unknown' };
      if (found.version !== move.version) return { ok: false, reason: 'stale' };
      const to = from + move.by;
      if (to < 0 || to >= order.length) return { ok: false, reason: 'no-way' };
      [order[from], order[to]] = [order[to], order[from]];
      // All are numbered again: gaps of removed versions close, and equal places of old rows part.
      order.forEach(({ id }, index) =>
        tx
          .update(firmwareVersion)
          .set({ place: index + 1 })
          .where(and(eq(firmwareVersion.id, id), eq(firmwareVersion.deviceId, deviceId)))
          .run()
      );
      const version = found.version + 1;
      tx.update(device).set({ version, updatedAt: now }).where(eq(device.id, deviceId)).run();
      const { name } = order[to];
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: deviceId };
      const detail = { name: found.name, version: name, place: to + 1, ...scriptOf(actor) };
      recordEvent(tx, { ...happening, action: 'device.order', detail }, now);
      return { ok: true, name, version };
    },
    { behavior: 'immediate' }
  );
}
