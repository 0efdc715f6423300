import { and, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { insertDataset } from './insert-dataset';
import { insertReport } from './insert-report';
import { insertSweep } from './insert-sweep';
import { openArchive, type ArchiveRefusal } from './open-archive';
import { readArchive } from './read-archive';

export type ImportArchive =
  | { ok: true; from: string; datasets: number; reports: number; remarks: number; sweeps: number }
  | ArchiveRefusal
  | { ok: false; reason: 'not-allowed' }
  /** This very archive was imported into this team before: when. Ask again with `again` to have everything twice. */
  | { ok: false; reason: 'imported-before'; at: number };

/**
 * Brings a team's archive into a team, by its lead: all of it or nothing. Ids are new. People are not matched with
 * anybody: what they made belongs to the team, and the events tell who made it. Links stay closed.
 *
 * @param again import it although it was imported before
 */
export function importArchive(
  db: Database,
  actor: Actor,
  bytes: Uint8Array,
  again = false,
  now = Date.now()
): ImportArchive {
  const may = (tx: Pick<Database, 'select'>) =>
    tx
      .select({ id: team.id })
      .from(team)
      .where(mayWhere(actor, 'manage', team.id))
      .get() !== undefined;
  if (!may(db)) return { ok: false, reason: 'not-allowed' };
  // Before the database is locked: reading a large archive takes seconds.
  const opened = openArchive(bytes);
  if (!opened.ok) return opened;
  const read = readArchive(opened);
  if (!read.ok) return read;
  return db.transaction(
    (tx): ImportArchive => {
      if (!may(tx)) return { ok: false, reason: 'not-allowed' };
      const before = tx
        .select({ at: event.at })
        .from(event)
        .where(
          and(
            eq(event.teamId, actor.teamId),
            eq(event.action, 'team.import'),
            sql`json_extract(${event.detail}, '$.archive') = ${opened.sha256}`
          )
        )
        .get();
      if (before && !again) return { ok: false, reason: 'imported-before', at: before.at };
      const ids = new Map<string, string>();
      const context = { teamId: actor.teamId, personId: actor.personId, madeBy: read.team.madeBy, now };
      for (const it of read.datasets) ids.set(it.path, insertDataset(tx, it, context));
      for (const it of read.reports) insertReport(tx, it, ids.get(it.about.dataset) ?? '', context);
      for (const it of read.sweeps) insertSweep(tx, it, context);
      const counted = {
        datasets: read.datasets.length,
        reports: read.reports.length,
        remarks: read.reports.reduce((sum, { about }) => sum + about.remarks.length, 0),
        sweeps: read.sweeps.length
      };
      const from = opened.manifest.team.name;
      recordEvent(
        tx,
        {
          action: 'team.import',
          teamId: actor.teamId,
          personId: actor.personId,
          detail: { ...counted, team: from, archive: opened.sha256 }
        },
        now
      );
      return { ok: true, from, ...counted };
    },
    { behavior: 'immediate' }
  );
}
