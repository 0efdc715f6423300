import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { team } from './team';

/** An address asked to join a team; the token is in the mail alone. */
export const invitation = sqliteTable(
  'invitation',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    email: text('email').notNull(),
    role: text('role', { enum: ['lead', 'experimenter', 'observer'] }).notNull(),
    tokenHash: text('token_hash').notNull().unique(),
    invitedBy: text('invited_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    expiresAt: time('expires_at').notNull(),
    acceptedAt: time('accepted_at'),
    revokedAt: time('revoked_at')
  },
  (table) => [index('invitation_by_team').on(table.teamId)]
);
