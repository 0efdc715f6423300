import type { DeviceCell } from '../../../model/team/devices/cell';
import type { DeviceVersion } from '../../../model/team/devices/device';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { cellsOf } from './cells-of';
import { findDevice } from './find-device';
import { versionsOf } from './versions-of';

export interface VersionView {
  device: { id: string; name: string };
  version: DeviceVersion;
  /** Its neighbours in the order of the device. */
  before: { id: string; name: string } | null;
  after: { id: string; name: string } | null;
  cells: DeviceCell[];
}

/** One firmware version of a device, with the datasets that stand for its groups. */
export function readVersion(
  db: Database,
  actor: Actor,
  deviceId: string,
  versionId: string
): { ok: true; view: VersionView } | { ok: false; reason: 'unknown' } {
  const found = findDevice(db, actor, deviceId, 'see');
  const order = found ? versionsOf(db, found) : [];
  const at = order.findIndex(({ id }) => id === versionId);
  if (!found || at < 0) return { ok: false, reason: 'unknown' };
  const named = (index: number) =>
    index < 0 || index >= order.length ? null : { id: order[index].id, name: order[index].name };
  const cells = cellsOf(db, found, order[at].name);
  return {
    ok: true,
    view: {
      device: { id: found.id, name: found.name },
      version: order[at],
      before: named(at - 1),
      after: named(at + 1),
      cells
    }
  };
}
