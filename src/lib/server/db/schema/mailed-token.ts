import { sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';

/** A token sent by mail, good once: to sign in, or to choose a new password. */
export const mailedToken = sqliteTable('mailed_token', {
  id: id(),
  purpose: text('purpose', { enum: ['sign-in', 'password'] }).notNull(),
  /** Lower case. Not a person: whoever signs in by mail for the first time becomes one. */
  email: text('email').notNull(),
  tokenHash: text('token_hash').notNull().unique(),
  createdAt: createdAt(),
  expiresAt: time('expires_at').notNull(),
  usedAt: time('used_at')
});
