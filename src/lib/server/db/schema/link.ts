import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { report } from './report';
import { sweep } from './sweep';
import { team } from './team';

/** An address that opens one report, or one sweep, to people outside the team. */
export const link = sqliteTable(
  'link',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    /** Exactly one of report and sweep is set. */
    reportId: text('report_id').references(() => report.id, { onDelete: 'cascade' }),
    sweepId: text('sweep_id').references(() => sweep.id, { onDelete: 'cascade' }),
    /** sha256 of the token; the token itself is shown once and kept nowhere. */
    tokenHash: text('token_hash').notNull().unique(),
    /** What the team calls it: "referee 2, second round". */
    label: text('label').notNull(),
    audience: text('audience', { enum: ['anyone', 'named', 'team'] }).notNull(),
    /** Addresses that may open a `named` link, lower case, as a JSON list. */
    people: text('people').notNull().default('[]'),
    shows: text('shows', { enum: ['report', 'report-and-counts'] }).notNull(),
    /** Hides team, device, firmware and people. */
    blind: integer('blind', { mode: 'boolean' }).notNull(),
    /** Hides from the team who remarked through it. */
    hidesReferees: integer('hides_referees', { mode: 'boolean' }).notNull(),
    allowsRemarks: integer('allows_remarks', { mode: 'boolean' }).notNull(),
    /** Visits allowed; null for any number. */
    visitLimit: integer('visit_limit'),
    expiresAt: time('expires_at'),
    revokedAt: time('revoked_at'),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt()
  },
  (table) => [
    index('link_by_report').on(table.reportId),
    index('link_by_sweep').on(table.sweepId),
    check('link_opens_one', sql`("report_id" IS NULL) <> ("sweep_id" IS NULL)`)
  ]
);
