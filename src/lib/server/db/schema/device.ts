import { integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { team } from './team';

/** A device of a team. Datasets name it in words; the row holds what belongs to the device itself. */
export const device = sqliteTable(
  'device',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    /** As datasets name it. */
    name: text('name').notNull(),
    notes: text('notes'),
    /** Grows with every change of the order of its versions: the second of two editors is told. */
    version: integer('version').notNull().default(1),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: time('updated_at').notNull()
  },
  (table) => [uniqueIndex('device_once').on(table.teamId, table.name)]
);
