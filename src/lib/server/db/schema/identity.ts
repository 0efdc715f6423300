import { primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt } from './columns';
import { person } from './person';

/** Who a person is at an OpenID Connect issuer. */
export const identity = sqliteTable(
  'identity',
  {
    issuer: text('issuer').notNull(),
    /** The issuer's `sub`: an address may change hands there, this never does. */
    subject: text('subject').notNull(),
    personId: text('person_id')
      .notNull()
      .references(() => person.id, { onDelete: 'cascade' }),
    createdAt: createdAt()
  },
  (table) => [primaryKey({ columns: [table.issuer, table.subject] })]
);
