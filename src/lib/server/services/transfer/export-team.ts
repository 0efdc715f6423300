import { count, eq } from 'drizzle-orm';
import type { Manifest, TeamFile } from '$lib/model/team/transfer/archive-schema';
import type { Database } from '../../db/client';
import { dataset, report, sweep, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { recordEvent } from '../events/record-event';
import { members } from '../teams/members';
import { archiveReadme } from './archive-readme';
import { datasetEntries, originalEntries } from './dataset-entries';
import { eventsFile } from './events-file';
import { jsonBytes } from './json-bytes';
import { MOST_NUMBERED } from './limits';
import { reportEntries } from './report-entries';
import { sweepEntries } from './sweep-entries';
import { zipStream, type Entry } from './zip-stream';

export type ExportTeam =
  | { ok: true; fileName: string; stream: ReadableStream<Uint8Array> }
  /** `too-many`: more datasets or reports than an archive is made for. */
  | { ok: false; reason: 'not-allowed' | 'too-many' };

/**
 * Everything the team has, as one zip: datasets as original bytes and as JSON and CSV, reports as the very bytes of
 * their documents, sweeps likewise, remarks, links without their tokens, members and events. Never hashes of passwords or tokens. What
 * was put aside is left out and counted in the manifest.
 */
export function exportTeam(db: Database, actor: Actor, now = Date.now()): ExportTeam {
  const it = db
    .select({ name: team.name, slug: team.slug })
    .from(team)
    .where(mayWhere(actor, 'manage', team.id))
    .get();
  if (!it) return { ok: false, reason: 'not-allowed' };
  const datasets = datasetEntries(db, actor.teamId);
  const reports = reportEntries(db, actor.teamId, datasets.paths);
  const sweeps = sweepEntries(db, actor.teamId);
  if ([datasets, reports, sweeps].some(({ paths }) => paths.size > MOST_NUMBERED))
    return { ok: false, reason: 'too-many' };

  const all = (table: typeof dataset | typeof report | typeof sweep) =>
    db.select({ n: count() }).from(table).where(eq(table.teamId, actor.teamId)).get()?.n ?? 0;
  const about: Omit<Manifest, 'files'> = {
    format: 'severalty.team/1',
    madeAt: new Date(now).toISOString(),
    team: it,
    leftOut: {
      datasets: all(dataset) - datasets.paths.size,
      reports: all(report) - reports.paths.size,
      sweeps: all(sweep) - sweeps.paths.size
    }
  };
  const teamFile: TeamFile = {
    ...it,
    members: members(db, actor).map(({ name, email, role, since }) => ({
      name,
      email,
      role,
      since: new Date(since).toISOString()
    })),
    madeBy: { ...datasets.madeBy, ...reports.madeBy, ...sweeps.madeBy }
  };
  recordEvent(
    db,
    {
      action: 'team.export',
      teamId: actor.teamId,
      personId: actor.personId,
      detail: { datasets: datasets.paths.size, reports: reports.paths.size, sweeps: sweeps.paths.size }
    },
    now
  );
  const entries: Entry[] = [
    { path: 'README.txt', bytes: () => archiveReadme(about) },
    { path: 'team.json', bytes: () => jsonBytes(teamFile) },
    ...datasets.entries,
    ...originalEntries(db, actor.teamId),
    { path: 'reports.json', bytes: () => jsonBytes(reports.file) },
    ...reports.entries,
    { path: 'sweeps.json', bytes: () => jsonBytes(sweeps.file) },
    ...sweeps.entries,
    { path: 'events.json', bytes: () => jsonBytes(eventsFile(db, actor)) }
  ];
  const day = about.madeAt.slice(0, 10);
  return { ok: true, fileName: `${it.slug}-${day}.zip`, stream: zipStream(entries, about) };
}
