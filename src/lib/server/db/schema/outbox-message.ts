import { sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id } from './columns';

/** Mail that was written but not sent: local mode has no mail server, and shows it on a page. */
export const outboxMessage = sqliteTable('outbox_message', {
  id: id(),
  to: text('to').notNull(),
  subject: text('subject').notNull(),
  text: text('text').notNull(),
  createdAt: createdAt()
});
