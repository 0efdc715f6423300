import type { person } from '../db/schema';

/** Who is signed in: what pages and services need of a person. */
export type Person = Pick<typeof person.$inferSelect, 'id' | 'email' | 'name'>;
