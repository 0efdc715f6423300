import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Who did what when. Rows are only ever added: triggers refuse changes, and no key ties them to what may go. */
export const event = sqliteTable(
  'event',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    at: integer('at').notNull(),
    /** Null for what belongs to no team: a sign-in, a changed password. */
    teamId: text('team_id'),
    /** Null for the program itself, and for strangers with a link. */
    personId: text('person_id'),
    linkId: text('link_id'),
    /** `dataset.upload`, `report.make`, `link.revoke`, `member.remove` … */
    action: text('action').notNull(),
    /** Id of what it was done to. */
    thing: text('thing'),
    /** What else matters, as JSON: never tokens, passwords or counts. */
    detail: text('detail')
  },
  (table) => [index('event_by_team').on(table.teamId, table.at)]
);
