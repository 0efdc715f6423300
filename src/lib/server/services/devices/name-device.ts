import { and, eq, max } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { device, firmwareVersion } from '../../db/schema';

/** A dataset that may name a device, and a firmware version of it. */
export interface Naming {
  teamId: string;
  /** Who named it; null for the program itself. */
  createdBy: string | null;
  device: string | null;
  firmware: string | null;
}

/**
 * Keeps the row of a device, and that of its firmware version, from the first time that a dataset names them. A new
 * version comes last in the order of its device. A firmware version without a device belongs to none and gets no row.
 *
 * @param db the transaction that saves what the dataset says, so that neither stands without the other
 */
export function nameDevice(
  db: Pick<Database, 'select' | 'insert'>,
  { teamId, createdBy, device: name, firmware }: Naming,
  now = Date.now()
): void {
  if (name === null) return;
  const made = { createdBy, createdAt: now, updatedAt: now };
  db.insert(device)
    .values({ ...made, id: newId(), teamId, name })
    .onConflictDoNothing()
    .run();
  if (firmware === null) return;
  const { id: deviceId } = db
    .select({ id: device.id })
    .from(device)
    .where(and(eq(device.teamId, teamId), eq(device.name, name)))
    .get()!;
  const last = db
    .select({ place: max(firmwareVersion.place) })
    .from(firmwareVersion)
    .where(eq(firmwareVersion.deviceId, deviceId))
    .get();
  db.insert(firmwareVersion)
    .values({ ...made, id: newId(), deviceId, name: firmware, place: (last?.place ?? 0) + 1 })
    .onConflictDoNothing()
    .run();
}
