import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { id, time } from './columns';
import { link } from './link';
import { person } from './person';

/** Somebody opened a link. No network address is kept. */
export const linkVisit = sqliteTable(
  'link_visit',
  {
    id: id(),
    linkId: text('link_id')
      .notNull()
      .references(() => link.id, { onDelete: 'cascade' }),
    at: time('at').notNull(),
    /** Who, when they were signed in. */
    personId: text('person_id').references(() => person.id, { onDelete: 'set null' }),
    outcome: text('outcome', { enum: ['opened', 'refused'] }).notNull()
  },
  (table) => [index('link_visit_by_link').on(table.linkId, table.at)]
);
