import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { moveAside, type Moved } from '../aside/move-aside';

/** Brings a sweep back that was put aside. Experimenters only their own. */
export const restoreSweep = (db: Database, actor: Actor, id: string, now?: number): Moved =>
  moveAside(db, actor, { kind: 'sweep', id, to: 'back' }, now);
