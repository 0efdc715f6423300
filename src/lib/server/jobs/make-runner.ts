import type { DiagnoseOptions, Progress } from '$lib/stats/types';
import { and, eq } from 'drizzle-orm';
import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import type { Database } from '../db/client';
import { job } from '../db/schema';
import { log } from '../log';
import { projectFolder } from '../project-folder';
import { stackOf } from '../running/stack-of';
import { claimJob, type ClaimedJob, type Turns } from './claim-job';
import { diagnosisPool, type Outcome } from './diagnosis-pool';
import { endDone, endFailed, type SaveReport } from './end-job';
import { tellJobChange } from './job-changes';
import { requeueAbandoned, requeueOwn } from './requeue';
import { forgetRunner, HEARTBEAT, newRunnerName } from './runner-name';
import { tellJob } from './tell-job';

export interface RunnerSettings {
  /** Jobs at a time; the available cores unless told otherwise. */
  threads?: number;
  /** Megabytes one job may take. */
  memory?: number;
  /** The built worker. */
  file?: string;
}

export interface Runner {
  readonly name: string;
  /** Looks at the queue now. */
  wake(): void;
  /** Ends the thread of a job that was cancelled, when it is one of this runner. */
  abort(jobId: string): void;
  /** Gives what runs back to the queue and touches the database no more. */
  stop(): Promise<void>;
}

/** Milliseconds between two looks at the queue and at what others cancelled; so a cancel is heard within a second. */
const LOOK = 800;
/** Milliseconds between two writes of a job's progress. */
const WRITE = 500;
/** Seconds that a database which is locked or full is asked again before the job fails. */
const PATIENCE = 120;

/** Takes jobs from the queue and runs each in a thread, as many at a time as there are cores. */
export function makeRunner(db: Database, saveReport: SaveReport, settings: RunnerSettings = {}): Runner {
  const { threads = Math.max(1, availableParallelism()), memory = 1024 } = settings;
  const file = settings.file ?? join(projectFolder(), 'build-worker', 'worker.js');
  const name = newRunnerName();
  const pool = diagnosisPool(file, threads, memory);
  const running = new Map<string, AbortController>();
  const turns: Turns = new Map();
  let stopped = false;
  let lastBeat = Date.now();

  const mine = and(eq(job.status, 'running'), eq(job.runner, name));

  function fill(): void {
    while (!stopped && running.size < threads) {
      const next = claimJob(db, name, turns);
      if (!next) return;
      void work(next);
    }
  }

  async function work(claimed: ClaimedJob): Promise<void> {
    const { id, teamId, counts } = claimed;
    const controller = new AbortController();
    running.set(id, controller);
    const tellEnd = tellJob(id, teamId);
    tellJobChange(teamId, id);
    let written = 0;
    const onProgress = ({ share, step }: Progress) => {
      if (stopped || Date.now() - written < WRITE) return;
      written = Date.now();
      trying('progress was not written', () => {
        db.update(job)
          .set({ share, step })
          .where(and(eq(job.id, id), mine))
          .run();
        tellJobChange(teamId, id);
      });
    };
    const options = JSON.parse(claimed.options) as DiagnoseOptions;
    const outcome: Outcome =
      counts === null
        ? { kind: 'failed', reason: 'The dataset was put aside before its turn came.' }
        : await pool.run({ job: id, counts, options }, controller.signal, onProgress);
    tellEnd(await settle(id, outcome, controller.signal));
    running.delete(id);
    if (stopped) return;
    tellJobChange(teamId, id);
    look();
  }

  /** Writes how a job ended, and says it. A full or locked database is asked again for a while: no work is lost by it. */
  async function settle(id: string, outcome: Outcome, signal: AbortSignal): Promise<Outcome['kind']> {
    let end = outcome;
    for (let second = 0; !stopped && !signal.aborted && end.kind !== 'aborted'; second++) {
      try {
        const held =
          end.kind === 'done'
            ? endDone(db, { id, runner: name }, end.document, saveReport)
            : endFailed(db, { id, runner: name }, end.reason);
        return held ? end.kind : 'aborted';
      } catch (error) {
        const why = error instanceof Error ? error.message : String(error);
        log('error', 'the end of a job was not written', { job: id, why: stackOf(error) });
        const passing = isPassing(error);
        // Else, given up by this process, it waits for the next look (see below).
        if (end.kind === 'failed' && !passing) return 'failed';
        if (!passing || second >= PATIENCE)
          end = { kind: 'failed', reason: `The report could not be saved: ${why}` };
        else await sleep(1000, undefined, { ref: false });
      }
    }
    return 'aborted';
  }

  function look(): void {
    if (stopped) return;
    const now = Date.now();
    trying('the queue was not looked at', () => {
      const held = new Set(
        db
          .select({ id: job.id })
          .from(job)
          .where(mine)
          .all()
          .map(({ id }) => id)
      );
      // Cancelled by another process, removed with its dataset, or given to another runner.
      for (const [id, controller] of running) if (!held.has(id)) controller.abort();
      for (const id of held)
        if (!running.has(id))
          endFailed(db, { id, runner: name }, 'How this diagnosis ended was not written.');
      if (now - lastBeat >= HEARTBEAT) {
        lastBeat = now;
        if (held.size > 0) db.update(job).set({ heartbeatAt: now }).where(mine).run();
        for (const { id, teamId } of requeueAbandoned(db, name, now)) tellJobChange(teamId, id);
      }
      fill();
    });
  }

  trying('left-over jobs were not looked at', () => requeueAbandoned(db, name));
  look();
  const timer = setInterval(look, LOOK).unref();

  return {
    name,
    wake: look,
    abort: (id) => running.get(id)?.abort(),
    async stop() {
      if (stopped) return;
      stopped = true;
      clearInterval(timer);
      for (const controller of running.values()) controller.abort();
      trying('jobs were not given back', () => requeueOwn(db, name));
      forgetRunner(name);
      await pool.destroy();
    }
  };
}

/** Locked or full: that passes. Drizzle wraps some of the driver's errors. */
function isPassing(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  const { code = '' } = error as { code?: string };
  return /^SQLITE_(BUSY|LOCKED|FULL|IOERR)/.test(code) || isPassing(error.cause);
}

/** The database may be locked or full for a while: that is told, and tried again at the next look. */
function trying(what: string, act: () => unknown): void {
  try {
    act();
  } catch (error) {
    log('error', what, { why: stackOf(error) });
  }
}
