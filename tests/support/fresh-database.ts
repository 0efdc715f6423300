import { openDatabase, type Database } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';

/** A database in memory with the real migrations and nothing in it. */
export function freshDatabase(): Database {
  const db = openDatabase(':memory:');
  migrateDatabase(db);
  return db;
}
