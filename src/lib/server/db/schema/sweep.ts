import { index, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { person } from './person';
import { team } from './team';

/** A sweep document kept as it was made. A trigger refuses every change of what it says. */
export const sweep = sqliteTable(
  'sweep',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    notes: text('notes'),
    /** The document, severalty.sweep/1, byte for byte. */
    document: text('document').notNull(),
    sha256: text('sha256').notNull(),
    /** SweepOptions as JSON. */
    options: text('options').notNull(),
    engineVersion: text('engine_version').notNull(),
    /** Its datasets as they were: id, name, digest and conditions of each, as JSON. */
    datasets: text('datasets').notNull(),
    createdBy: text('created_by').references(() => person.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    deletedAt: time('deleted_at'),
    deletedBy: text('deleted_by').references(() => person.id, { onDelete: 'set null' })
  },
  (table) => [index('sweep_by_team').on(table.teamId, table.deletedAt, table.createdAt)]
);
