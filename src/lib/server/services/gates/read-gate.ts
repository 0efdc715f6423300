import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { findDevice } from '../devices/find-device';
import { versionsOf } from '../devices/versions-of';
import { decideGate, type DecidedGate } from './decide-gate';

/** The gate of a version, decided from how its datasets stand now. */
export function readGate(
  db: Database,
  actor: Actor,
  deviceId: string,
  versionId: string,
  now = Date.now()
): DecidedGate | { ok: false; reason: 'unknown' } {
  const device = findDevice(db, actor, deviceId, 'see');
  const version = device && versionsOf(db, device).find(({ id }) => id === versionId);
  if (!device || !version) return { ok: false, reason: 'unknown' };
  return decideGate(db, device, version, now);
}
