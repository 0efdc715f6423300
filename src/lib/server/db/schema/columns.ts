import { integer, text } from 'drizzle-orm/sqlite-core';

/** Random name of a row, made by newId: 128 bits, so it cannot be guessed or counted up. */
export const id = () => text('id').primaryKey();

/** Milliseconds since 1970, UTC. */
export const time = (name: string) => integer(name);

/** When the row was made; milliseconds since 1970. */
export const createdAt = () => integer('created_at').notNull();
