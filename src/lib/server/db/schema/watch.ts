import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { person } from './person';
import { team } from './team';
import { time } from './columns';

/** What one member wants to hear of one team by mail. No row: nothing but what concerns their own reports. */
export const watch = sqliteTable(
  'watch',
  {
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    /** JSON: `gate-fail`, `remark`, `job-end`, each with the last event before it was chosen. */
    about: text('about').notNull(),
    /** At once, or one mail a day. */
    rhythm: text('rhythm', { enum: ['at-once', 'daily'] }).notNull(),
    /** Last row of `event` that this person was told of. */
    lastEvent: integer('last_event').notNull(),
    /** When the last mail went out; null before the first. */
    lastDigestAt: time('last_digest_at'),
    updatedAt: time('updated_at').notNull()
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.teamId] }),
    index('watch_by_team').on(table.teamId)
  ]
);
