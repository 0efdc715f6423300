import type { DeviceCell } from '../../../model/team/devices/cell';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { cellsOf } from './cells-of';
import { findDevice } from './find-device';

export interface DeviceMatrix {
  /** Groups by name, numbers in them by size; the whole device, null, comes first. */
  groups: (string | null)[];
  cells: DeviceCell[];
}

const byName = new Intl.Collator('en', { numeric: true });

/** Every group of a device under every firmware version, with the dataset that stands for it. */
export function deviceMatrix(
  db: Database,
  actor: Actor,
  id: string
): { ok: true; matrix: DeviceMatrix } | { ok: false; reason: 'unknown' } {
  const found = findDevice(db, actor, id, 'see');
  if (!found) return { ok: false, reason: 'unknown' };
  const cells = cellsOf(db, found);
  const groups = [...new Set(cells.map(({ group }) => group))].sort((a, b) =>
    a === null || b === null ? Number(b === null) - Number(a === null) : byName.compare(a, b)
  );
  return { ok: true, matrix: { groups, cells } };
}
