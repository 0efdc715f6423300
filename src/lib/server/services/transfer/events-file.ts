import type { Database } from '../../db/client';
import type { Actor } from '../access/actor';
import { listEvents } from '../events/list-events';

/** Every event of the team in words, newest first, as its list tells them. */
export function eventsFile(db: Database, actor: Actor): { at: string; action: string; words: string }[] {
  const all = [];
  let before: number | undefined;
  for (;;) {
    const { events, next } = listEvents(db, actor, { before }, 1000);
    for (const { at, action, words } of events) all.push({ at: new Date(at).toISOString(), action, words });
    if (next === null) return all;
    before = next;
  }
}
