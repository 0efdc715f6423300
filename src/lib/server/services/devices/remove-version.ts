import { and, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { device, firmwareVersion } from '../../db/schema';
import type { Actor } from '../access/actor';
import { scriptOf } from '../access/script-of';
import { recordEvent } from '../events/record-event';
import { findDevice } from './find-device';
import { versionsOf } from './versions-of';

export type RemovedVersion =
  | { ok: true; name: string }
  /** `named`: datasets name it, put aside or not, and would bring it back. */
  | { ok: false; reason: 'unknown' | 'named' };

/** Removes a firmware version that no dataset names, with its notes. A gate's rule that refers to it keeps its name. */
export function removeVersion(
  db: Database,
  actor: Actor,
  deviceId: string,
  versionId: string,
  now = Date.now()
): RemovedVersion {
  return db.transaction(
    (tx): RemovedVersion => {
      const found = findDevice(tx, actor, deviceId, 'edit');
      const gone = found && versionsOf(tx, found).find(({ id }) => id === versionId);
      if (!gone) return { ok: false, reason: 'unknown' };
      if (gone.datasets + gone.aside > 0) return { ok: false, reason: 'named' };
      tx.delete(firmwareVersion)
        .where(and(eq(firmwareVersion.id, versionId), eq(firmwareVersion.deviceId, deviceId)))
        .run();
      tx.update(device)
        .set({ version: found.version + 1, updatedAt: now })
        .where(eq(device.id, deviceId))
        .run();
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: deviceId };
      const detail = { name: found.name, version: gone.name, ...scriptOf(actor) };
      recordEvent(tx, { ...happening, action: 'device.remove-version', detail }, now);
      return { ok: true, name: gone.name };
    },
    { behavior: 'immediate' }
  );
}
