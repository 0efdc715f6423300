import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { team } from './team';

/** A key with which a script of a team acts for who made it. It goes when they do. */
export const apiToken = sqliteTable(
  'api_token',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    /** What the team calls it: "nightly upload". */
    name: text('name').notNull(),
    /** sha256 of the token; the token itself is shown once and kept nowhere. */
    tokenHash: text('token_hash').notNull().unique(),
    /** How it begins, so that people recognise it in a script: `sev_` and eight letters, which open nothing. */
    hint: text('hint').notNull(),
    /** What the script may be at most; who made it may have become less since. */
    role: text('role', { enum: ['lead', 'experimenter', 'observer'] }).notNull(),
    /** Scopes as a JSON list: read, upload, diagnose. */
    scopes: text('scopes').notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
    expiresAt: time('expires_at').notNull(),
    /** Beginning of the last day, in UTC, on which it was used: nobody's hours are kept. */
    lastUsedOn: time('last_used_on'),
    revokedAt: time('revoked_at')
  },
  (table) => [index('api_token_by_team').on(table.teamId, table.createdAt)]
);
