import Connection from 'better-sqlite3';
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';
import { closeSync, mkdirSync, openSync } from 'node:fs';
import { join } from 'node:path';
import * as schema from './schema';

export type Database = BetterSQLite3Database<typeof schema> & { $client: Connection.Database };

/** Milliseconds a writer waits for another one (a second process, a backup) before SQLITE_BUSY. */
const BUSY_TIMEOUT = 5_000;

/** Path of the database file in a data folder; both are made when missing, for their owner's eyes alone. */
export function databaseFile(folder: string): string {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const file = join(folder, 'severalty.sqlite');
  // SQLite gives its write-ahead log the permissions of the database.
  closeSync(openSync(file, 'a', 0o600));
  return file;
}

/**
 * Opens a database without migrating it.
 *
 * @param file path, or ':memory:' for a database of its own that is gone when closed
 */
export function openDatabase(file: string): Database {
  const connection = new Connection(file, { timeout: BUSY_TIMEOUT });
  connection.pragma('journal_mode = WAL');
  // With WAL, NORMAL can lose the last transactions at a power cut but never corrupts the file.
  connection.pragma('synchronous = NORMAL');
  connection.pragma('foreign_keys = ON');
  return drizzle(connection, { schema });
}
