import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Example files that come with the application: shown beside the form, read only. */
export const sample = sqliteTable('sample', {
  id: integer('id').primaryKey({ autoIncrement: true }),
  /** Name in addresses; never changes once shipped. */
  slug: text('slug').notNull().unique(),
  title: text('title').notNull(),
  /** What was counted, in one or two sentences. */
  about: text('about').notNull(),
  /** What made the counts: the known cause of invented data, or what is known of published data. */
  cause: text('cause').notNull(),
  /** Where the numbers come from: the publication, or the generator and its seed. */
  source: text('source').notNull(),
  invented: integer('invented', { mode: 'boolean' }).notNull(),
  /** Largest possible count; null when unknown or unbounded. */
  trials: integer('trials'),
  unit: text('unit', { enum: ['defect', 'pair'] }).notNull(),
  geometry: text('geometry', { enum: ['sites', 'open-bonds', 'ring-bonds'] }).notNull(),
  fileName: text('file_name').notNull(),
  /** The file as it is read, comments included. */
  text: text('text').notNull(),
  /** Place in the list. */
  order: integer('order').notNull()
});
