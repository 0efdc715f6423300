import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { join } from 'node:path';
import { projectFolder } from '../project-folder';
import type { Database } from './client';

/**
 * Brings the database up to the committed migrations.
 *
 * A migration that rebuilds a table (drizzle-kit writes one for most column changes) drops the old table.
 * It opens with `PRAGMA foreign_keys=OFF`, but SQLite ignores that inside a transaction, which is where the
 * migrator runs it, and `ON DELETE CASCADE` would then empty the child tables. So foreign keys are switched
 * off here, outside, and checked afterwards.
 *
 * @param folder migrations; the project's own unless a test says otherwise
 * @throws when rows are left that refer to nothing, naming table and row
 */
export function migrateDatabase(db: Database, folder = join(projectFolder(), 'drizzle')): void {
  const connection = db.$client;
  connection.pragma('foreign_keys = OFF');
  try {
    try {
      migrate(db, { migrationsFolder: folder });
    } catch {
      // Another process may have migrated between our look and our lock ("table already exists"). Then the
      // second look finds nothing left to do; a migration that is wrong fails the same way again.
      migrate(db, { migrationsFolder: folder });
    }
    const broken = connection.pragma('foreign_key_check') as {
      table: string;
      rowid: number;
      parent: string;
    }[];
    if (broken.length > 0) {
      const rows = broken.slice(0, 5).map((row) => `${row.table} ${row.rowid} → ${row.parent}`);
      throw new Error(
        `After migrating, ${broken.length} rows refer to rows that do not exist: ${rows.join(', ')}`
      );
    }
  } finally {
    connection.pragma('foreign_keys = ON');
  }
}
