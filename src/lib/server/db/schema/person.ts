import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id, time } from './columns';

/** Somebody who can sign in. */
export const person = sqliteTable('person', {
  id: id(),
  /** As mail is sent to it, in lower case: addresses are compared so. */
  email: text('email').notNull().unique(),
  name: text('name').notNull(),
  /** argon2id in its own text form; null for people who come by mailed link or from an institution. */
  passwordHash: text('password_hash'),
  /** The address was shown to be theirs: a mailed link was followed, or an issuer vouched for it. */
  emailVerifiedAt: time('email_verified_at'),
  /** Disabled people cannot sign in, and their sessions end at once. */
  disabledAt: time('disabled_at'),
  /** Grows when the password changes or the person is removed or disabled: sessions that hold an older one end. */
  sessionVersion: integer('session_version').notNull().default(0),
  createdAt: createdAt()
});
