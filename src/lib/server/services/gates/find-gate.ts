import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { versionsOf } from '../devices/versions-of';
import { findNamedDevice } from './find-named-device';

/** The ids of a device and a version of it, each given by its id or its name; a name goes before an id. */
export function findGate(
  db: Database,
  actor: Actor,
  named: { device: string; version: string }
): { ok: true; device: Ids; version: Ids } | { ok: false; reason: 'no-device' | 'no-version' } {
  const one = findNamedDevice(db, actor, named.device);
  if (!one) return { ok: false, reason: 'no-device' };
  const versions = versionsOf(db, one);
  const version =
    versions.find(({ name }) => name === named.version) ?? versions.find(({ id }) => id === named.version);
  if (!version) return { ok: false, reason: 'no-version' };
  const ids = ({ id, name }: Ids) => ({ id, name });
  return { ok: true, device: ids(one), version: ids(version) };
}

interface Ids {
  id: string;
  name: string;
}
