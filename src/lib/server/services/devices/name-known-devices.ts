import { asc, isNotNull, min } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import { nameDevice } from './name-device';

/**
 * Gives every device and firmware version that a dataset names its row, in the order in which they came. Called at
 * start, for datasets that were saved before devices had rows; where all have one it changes nothing.
 */
export function nameKnownDevices(db: Database): void {
  db.transaction(
    (tx) => {
      const first = min(dataset.createdAt);
      const named = tx
        .select({ teamId: dataset.teamId, device: dataset.device, firmware: dataset.firmware, first })
        .from(dataset)
        .where(isNotNull(dataset.device))
        .groupBy(dataset.teamId, dataset.device, dataset.firmware)
        .orderBy(asc(first))
        .all();
      for (const { first: at, ...names } of named)
        nameDevice(tx, { ...names, createdBy: null }, at ?? Date.now());
    },
    { behavior: 'immediate' }
  );
}
