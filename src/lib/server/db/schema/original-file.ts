import { blob, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { createdAt, id } from './columns';
import { team } from './team';

/** A file as it was uploaded, byte for byte; several datasets may come from one. */
export const originalFile = sqliteTable(
  'original_file',
  {
    id: id(),
    teamId: text('team_id')
      .notNull()
      .references(() => team.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    /** sha256 of the bytes, 64 hexadecimal digits. */
    sha256: text('sha256').notNull(),
    size: integer('size').notNull(),
    bytes: blob('bytes', { mode: 'buffer' }).notNull(),
    createdAt: createdAt()
  },
  (table) => [uniqueIndex('original_file_once').on(table.teamId, table.sha256)]
);
