import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { moveAside, type Moved } from '../aside/move-aside';

/** Takes a sweep out of every list; it can be brought back for 30 days. Experimenters only their own. */
export const putSweepAside = (db: Database, actor: Actor, id: string, now?: number): Moved =>
  moveAside(db, actor, { kind: 'sweep', id, to: 'aside' }, now);
