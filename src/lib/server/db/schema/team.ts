import { sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { createdAt, id } from './columns';

/** People who share datasets and reports. */
export const team = sqliteTable('team', {
  id: id(),
  /** Name in addresses: lower case letters, digits and hyphens; never changes. */
  slug: text('slug').notNull().unique(),
  name: text('name').notNull(),
  createdAt: createdAt()
});
