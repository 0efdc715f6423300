import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { team } from './team';

/** An address of the team's own that is told what happens, signed. */
export const webhook = sqliteTable(
  'webhook',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    url: text('url').notNull(),
    /** Key of the signatures, sealed with the server's secret: it has to be read again, so a hash would not do. */
    sealedSecret: text('sealed_secret').notNull(),
    /** Actions it is told of, as a JSON list. */
    actions: text('actions').notNull(),
    /** Last row of `event` that was looked at for it. */
    lastEvent: integer('last_event').notNull(),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    /** Nothing is sent while it rests: by hand, or after a week of failures. */
    restingSince: time('resting_since'),
    restingWhy: text('resting_why'),
    /** When it was last woken; failures before count no more. */
    awakeSince: time('awake_since')
  },
  (table) => [index('webhook_by_team').on(table.teamId, table.createdAt)]
);
