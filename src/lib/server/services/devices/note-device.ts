import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { device, firmwareVersion } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';
import { findDevice } from './find-device';

export type NotedDevice = { ok: true; version: number } | { ok: false; reason: 'unknown' | 'stale' };

/**
 * Writes the notes on a device, or on one of its firmware versions, if nobody changed the device since the editor saw
 * it.
 *
 * @param edit.versionId null for the device itself
 * @param edit.notes null to have none
 * @param edit.version of the device, as the page showed it
 */
export function noteDevice(
  db: Database,
  actor: Actor,
  deviceId: string,
  edit: { versionId: string | null; notes: string | null; version: number },
  now = Date.now()
): NotedDevice {
  return db.transaction(
    (tx): NotedDevice => {
      const found = findDevice(tx, actor, deviceId, 'edit');
      if (!found) return { ok: false, reason: 'unknown' };
      const { versionId, notes } = edit;
      const here =
        versionId === null
          ? undefined
          : tx
              .select()
              .from(firmwareVersion)
              .where(and(eq(firmwareVersion.id, versionId), eq(firmwareVersion.deviceId, deviceId)))
              .get();
      if (versionId !== null && !here) return { ok: false, reason: 'unknown' };
      // A second press of the button finds the notes as it wants them.
      if ((here ?? found).notes === notes) return { ok: true, version: found.version };
      if (found.version !== edit.version) return { ok: false, reason: 'stale' };
      if (here)
        tx.update(firmwareVersion)
          .set({ notes, updatedAt: now })
          .where(eq(firmwareVersion.id, here.id))
          .run();
      const version = found.version + 1;
      tx.update(device)
        .set({ version, updatedAt: now, ...(here ? {} : { notes }) })
        .where(eq(device.id, deviceId))
        .run();
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: deviceId };
      const detail = { name: found.name, version: here?.name ?? null, ...scriptOf(actor) };
      recordEvent(tx, { ...happening, action: 'device.notes', detail }, now);
      return { ok: true, version };
    },
    { behavior: 'immediate' }
  );
}
