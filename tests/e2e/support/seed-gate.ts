import { dataset } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { readDevice } from '$lib/server/services/devices/read-device';
import { setRule } from '$lib/server/services/gates/set-rule';
import { eq } from 'drizzle-orm';
import { withDatabaseOf } from './seed-people';
import type { RunningServer } from './start-server';

/** Names a dataset as group q1 of device Kelp under ebb 3.1, and sets that version as the reference of its gate. */
export const seedGate = (server: RunningServer, actor: Actor, datasetId: string): Promise<string> =>
  withDatabaseOf(server, (db) => {
    const named = { device: 'Kelp', firmware: 'ebb 3.1', group: 'q1' };
    db.update(dataset).set(named).where(eq(dataset.id, datasetId)).run();
    nameKnownDevices(db);
    const device = listDevices(db, actor).find(({ name }) => name === 'Kelp')!;
    const read = readDevice(db, actor, device.id);
    if (!read.ok) throw new Error(read.reason);
    const referenceId = read.device.versions[0].id;
    setRule(db, actor, device.id, { version: 0, referenceId, tolerance: 0.1, alpha: 0.05, groups: null });
    return device.id;
  });
