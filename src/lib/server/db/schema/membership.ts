import { index, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt } from './columns';
import { person } from './person';
import { team } from './team';

/** A person in a team, with one role. */
export const membership = sqliteTable(
  'membership',
  {
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    role: text('role', { enum: ['lead', 'experimenter', 'observer'] }).notNull(),
    createdAt: createdAt()
  },
  (table) => [
    primaryKey({ columns: [table.teamId, table.personId] }),
    index('membership_by_person').on(table.personId)
  ]
);
