import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';
import { webhook } from './webhook';

/** One message to one webhook, and what came of it. */
export const webhookDelivery = sqliteTable(
  'webhook_delivery',
  {
    id: id(),
    webhookId: text('webhook_id')
      .notNull()
      .references(() => webhook.id, { onDelete: 'cascade' }),
    eventId: integer('event_id').notNull(),
    action: text('action').notNull(),
    /** What is sent, byte for byte: it is signed anew at each attempt, since the signature holds the moment. */
    body: text('body').notNull(),
    status: text('status', { enum: ['waiting', 'sent', 'given-up'] }).notNull(),
    attempts: integer('attempts').notNull().default(0),
    /** When it is to be tried next; null once it is sent or given up. */
    dueAt: time('due_at'),
    /** Last answer: HTTP status, or why there was none. */
    answered: integer('answered'),
    trouble: text('trouble'),
    /** Asked for by somebody: tried once, before those that wait in their order. */
    byHand: integer('by_hand', { mode: 'boolean' }).notNull().default(false),
    createdAt: createdAt(),
    endedAt: time('ended_at')
  },
  (table) => [
    uniqueIndex('webhook_delivery_once').on(table.webhookId, table.eventId),
    index('webhook_delivery_due').on(table.status, table.dueAt),
    index('webhook_delivery_by_webhook').on(table.webhookId, table.createdAt)
  ]
);
