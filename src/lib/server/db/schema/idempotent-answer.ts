import { index, integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { apiToken } from './api-token';
import { createdAt } from './columns';

/** What a script was answered under an Idempotency-Key, so that asking again does nothing twice. */
export const idempotentAnswer = sqliteTable(
  'idempotent_answer',
  {
    tokenId: text('token_id')
      .notNull()
      .references(() => apiToken.id, { onDelete: 'cascade' }),
    key: text('key').notNull(),
    /** sha256 of method, address, type and body: the same key with another request is a mistake. */
    fingerprint: text('fingerprint').notNull(),
    status: integer('status').notNull(),
    location: text('location'),
    /** JSON. */
    body: text('body').notNull(),
    createdAt: createdAt()
  },
  (table) => [
    primaryKey({ columns: [table.tokenId, table.key] }),
    index('idempotent_answer_by_age').on(table.createdAt)
  ]
);
