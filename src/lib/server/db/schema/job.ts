import { index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { dataset } from './dataset';
import { person } from './person';
import { report } from './report';
import { team } from './team';

/** A diagnosis to be run by the server. */
export const job = sqliteTable(
  'job',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    datasetId: text('dataset_id')
      .notNull()
      .references(() => dataset.id, { onDelete: 'cascade' }),
    /** DiagnoseOptions as JSON. */
    options: text('options').notNull(),
    status: text('status', { enum: ['queued', 'running', 'done', 'failed', 'cancelled'] }).notNull(),
    /** Share done, 0 to 1, and the step in hand. */
    share: real('share').notNull().default(0),
    step: text('step'),
    /** Why it failed, in words. */
    reason: text('reason'),
    reportId: text('report_id').references(() => report.id, { onDelete: 'set null' }),
    /** Times it was begun; a job that ends its server three times is given up. */
    attempts: integer('attempts').notNull().default(0),
    /** Process that runs it, and when that last showed life. */
    runner: text('runner'),
    heartbeatAt: time('heartbeat_at'),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    startedAt: time('started_at'),
    endedAt: time('ended_at')
  },
  (table) => [
    index('job_by_status').on(table.status, table.createdAt),
    index('job_by_team').on(table.teamId, table.createdAt),
    index('job_by_dataset').on(table.datasetId)
  ]
);
