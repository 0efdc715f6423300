import type { Progress } from '$lib/stats/types';

export const JOB_STATUSES = ['queued', 'running', 'done', 'failed', 'cancelled'] as const;
export type JobStatus = (typeof JOB_STATUSES)[number];

/** A diagnosis asked of the server, as the team sees it. Times are milliseconds since 1970. */
export interface JobRow {
  id: string;
  status: JobStatus;
  dataset: { id: string; name: string };
  /** Share done, 0 to 1. */
  share: number;
  step: Progress['step'] | null;
  /** Milliseconds it has been running, by the server's clock; null when it does not run. */
  elapsed: number | null;
  /** Why it failed, in words. */
  reason: string | null;
  /** What it made; null when that was not made, or was put aside. */
  report: { id: string; number: number } | null;
  /** Name of who asked; null when they are gone. */
  by: string | null;
  createdAt: number;
  endedAt: number | null;
}

/** One page of a team's jobs: running, then queued in their order, then ended, newest first. */
export interface JobList {
  rows: JobRow[];
  /** Jobs that the filter finds. */
  total: number;
  queued: number;
  running: number;
  page: number;
  size: number;
}
