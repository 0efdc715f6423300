import type { SweepRequest } from '../../../model/team/sweeps/sweep-request';
import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { keepSweep, type SavedSweep } from './keep-sweep';

export type { SavedSweep };

/** Makes a sweep of saved datasets and keeps its document, with what the datasets were when it was made. */
export const saveSweep = (db: Database, actor: Actor, asked: SweepRequest, now = Date.now()): SavedSweep =>
  db.transaction((tx) => keepSweep(tx, actor, asked, now), { behavior: 'immediate' });
