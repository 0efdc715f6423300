import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { report } from './report';
import { team } from './team';

/** An address that opens one report to people outside the team. */
export const link = sqliteTable(
  'link',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    reportId: text('report_id')
      .notNull()
      .references(() => report.id, { onDelete: 'cascade' }),
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
  (table) => [index('link_by_report').on(table.reportId)]
);
