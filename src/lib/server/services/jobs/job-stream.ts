import { and, count, eq, inArray, isNull } from 'drizzle-orm';
import type { JobRow } from '../../../model/team/jobs/job-row';
import type { Database } from '../../db/client';
import { job, membership, person } from '../../db/schema';
import { onJobChange } from '../../jobs/job-changes';
import type { Actor } from '../access/actor';
import { jobsByIds, livelyJobs } from './list-jobs';

/** Milliseconds between two looks at what other processes changed, and at whether the reader is still in the team. */
const LOOK = 2_000;
/** Milliseconds that changes are gathered before they are sent. */
const GATHER = 150;
/** Milliseconds between two comments that keep proxies from closing a silent stream. */
const COMMENT = 15_000;

/**
 * Server-sent events of a team's jobs. `state` {queued, running}: at the beginning and whenever one of the two numbers
 * changes, so who comes back after a break asks for the lists anew. `job`: a JobRow that changed. Ends when the
 * reader leaves the team, is disabled or changes the password; when they go away; when the server shuts down.
 */
export function jobStream(db: Database, actor: Actor, signal: AbortSignal): ReadableStream<Uint8Array> {
  let end = () => {};
  return new ReadableStream<Uint8Array>(
    {
      start(controller) {
        const encoder = new TextEncoder();
        const write = (text: string) => controller.enqueue(encoder.encode(text));
        const session = sessionOf(db, actor);
        const changed = new Set<string>();
        /** What was sent last of each job that is or was just running. */
        let sent = new Map<string, string>();
        let state = '';
        let soon: NodeJS.Timeout | undefined;

        const send = (row: JobRow) => {
          const now = `${row.status} ${row.share} ${row.step}`;
          if (sent.get(row.id) === now) return;
          sent.set(row.id, now);
          write(`event: job\ndata: ${JSON.stringify(row)}\n\n`);
        };
        const sendState = () => {
          const now = JSON.stringify(countsOf(db, actor));
          if (now !== state) write(`event: state\ndata: ${now}\n\n`);
          state = now;
        };
        // A reader that is slow gets less often what is newest, and fills no memory.
        const slow = () => (controller.desiredSize ?? 1) <= 0;
        const ending = (act: () => void) => () => {
          try {
            if (slow()) return;
            if (session === null || sessionOf(db, actor) !== session) end();
            else act();
          } catch {
            // The database is closed or locked: the browser comes back, and sees the state of then.
            end();
          }
        };
        const flush = ending(() => {
          const ids = [...changed];
          changed.clear();
          for (const row of jobsByIds(db, actor, ids)) send(row);
          sendState();
        });
        const look = ending(() => {
          const rows = livelyJobs(db, actor, Date.now() - 3 * LOOK);
          for (const row of rows) send(row);
          const lively = new Set(rows.map(({ id }) => id));
          // Back in the queue, or gone.
          const quiet = [...sent.keys()].filter((id) => !lively.has(id));
          for (const row of jobsByIds(db, actor, quiet)) send(row);
          sent = new Map([...sent].filter(([id]) => lively.has(id)));
          sendState();
        });

        const deaf = onJobChange(actor.teamId, (id) => {
          changed.add(id);
          soon ??= setTimeout(() => {
            soon = undefined;
            flush();
          }, GATHER);
        });
        const timers = [setInterval(look, LOOK), setInterval(() => write(': still here\n\n'), COMMENT)];
        timers.forEach((timer) => timer.unref());
        end = () => {
          end = () => {};
          deaf();
          clearTimeout(soon);
          timers.forEach((timer) => clearInterval(timer));
          signal.removeEventListener('abort', leave);
          try {
            controller.close();
          } catch {
            // Cancelled by the reader: there is nothing left to close.
          }
        };
        const leave = () => end();
        signal.addEventListener('abort', leave);
        write('retry: 2000\n\n');
        look();
      },
      cancel: () => end()
    },
    new CountQueuingStrategy({ highWaterMark: 32 })
  );
}

/** Changes when the password does; null when the person is not in the team any more, or is disabled. */
function sessionOf(db: Database, actor: Actor): number | null {
  const found = db
    .select({ version: person.sessionVersion })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(
      and(
        eq(membership.teamId, actor.teamId),
        eq(membership.personId, actor.personId),
        isNull(person.disabledAt)
      )
    )
    .get();
  return found?.version ?? null;
}

function countsOf(db: Database, actor: Actor): { queued: number; running: number } {
  const rows = db
    .select({ status: job.status, jobs: count() })
    .from(job)
    .where(and(eq(job.teamId, actor.teamId), inArray(job.status, ['queued', 'running'])))
    .groupBy(job.status)
    .all();
  const of = (wanted: string) => rows.find(({ status }) => status === wanted)?.jobs ?? 0;
  return { queued: of('queued'), running: of('running') };
}
