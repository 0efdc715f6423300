import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { moveAside, type Moved } from '../aside/move-aside';

/** Takes a dataset out of every list; it can be brought back for 30 days. Experimenters only their own. */
export const putAside = (db: Database, actor: Actor, id: string, now?: number): Moved =>
  moveAside(db, actor, { kind: 'dataset', id, to: 'aside' }, now);
