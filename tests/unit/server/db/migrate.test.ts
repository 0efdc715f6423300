import { mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';

const CREATE = `CREATE TABLE team (id integer PRIMARY KEY, name text);
--> statement-breakpoint
CREATE TABLE dataset (id integer PRIMARY KEY, team_id integer NOT NULL REFERENCES team(id) ON DELETE cascade);
`;
/** What drizzle-kit writes when a column changes: a new table, the rows copied, the old one dropped. */
const REBUILD = `PRAGMA foreign_keys=OFF;
--> statement-breakpoint
CREATE TABLE __new_team (id integer PRIMARY KEY, name text NOT NULL);
--> statement-breakpoint
INSERT INTO __new_team SELECT id, name FROM team;
--> statement-breakpoint
DROP TABLE team;
--> statement-breakpoint
ALTER TABLE __new_team RENAME TO team;
--> statement-breakpoint
PRAGMA foreign_keys=ON;
`;

let folder: string;
let db: Database;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-migrate-'));
  mkdirSync(join(folder, 'meta'));
  db = openDatabase(':memory:');
});

afterEach(() => {
  db.$client.close();
  rmSync(folder, { recursive: true, force: true });
});

describe('migrateDatabase', () => {
  it('keeps the rows of child tables when a parent table is rebuilt', () => {
    lay(CREATE);
    migrateDatabase(db, folder);
    db.$client.exec(
      "INSERT INTO team VALUES (1, 'Wrackline'); INSERT INTO dataset VALUES (1, 1), (2, 1), (3, 1);"
    );
    lay(CREATE, REBUILD);
    migrateDatabase(db, folder);
    expect(count('team')).toBe(1);
    expect(count('dataset')).toBe(3);
  });

  it('would lose them with foreign keys on: the trap is real', () => {
    lay(CREATE);
    migrateDatabase(db, folder);
    db.$client.exec(
      "INSERT INTO team VALUES (1, 'Wrackline'); INSERT INTO dataset VALUES (1, 1), (2, 1), (3, 1);"
    );
    db.$client.exec('BEGIN');
    for (const statement of REBUILD.split('--> statement-breakpoint')) db.$client.exec(statement);
    db.$client.exec('COMMIT');
    expect(count('dataset')).toBe(0);
  });

  it('switches foreign keys on again', () => {
    lay(CREATE);
    migrateDatabase(db, folder);
    expect(() => db.$client.exec('INSERT INTO dataset VALUES (1, 99)')).toThrow(/FOREIGN KEY/);
  });

  it('names the rows that a migration leaves pointing at nothing', () => {
    lay(CREATE);
    migrateDatabase(db, folder);
    db.$client.exec("INSERT INTO team VALUES (7, 'Wrackline'); INSERT INTO dataset VALUES (1, 7);");
    lay(CREATE, 'DELETE FROM team;');
    expect(() => migrateDatabase(db, folder)).toThrow(
      /1 rows refer to rows that do not exist: dataset 1 → team/
    );
    expect(db.$client.pragma('foreign_keys', { simple: true })).toBe(1);
  });

  it('keeps datasets that are older than counts kept and the uncertainty of a misread rate', () => {
    const files = readdirSync('drizzle').filter((name) => name.endsWith('.sql'));
    const older = files
      .filter((name) => name < '0005')
      .map((name) => readFileSync(join('drizzle', name), 'utf8'));
    for (const statement of older.join('--> statement-breakpoint').split('--> statement-breakpoint'))
      db.$client.exec(statement);
    db.$client.exec(`INSERT INTO team (id, slug, name, created_at) VALUES ('t', 'ours', 'Ours', 1);
      INSERT INTO original_file (id, team_id, name, sha256, size, bytes, created_at)
        VALUES ('f', 't', 'f.csv', 'x', 0, x'', 1);
      INSERT INTO dataset (id, team_id, name, file_id, reading, counts, kind, digest, shots, mean, largest, geometry,
        unit, misread, created_at, updated_at)
        VALUES ('d', 't', 'Old', 'f', '{}', '{}', 'histogram', 'x', 3, 1, 2, 'sites', 'defect', 0.01, 1, 1);`);
    const added = readFileSync('drizzle/0005_cut-and-uncertainty.sql', 'utf8');
    for (const statement of added.split('--> statement-breakpoint')) db.$client.exec(statement);
    expect(db.$client.prepare('SELECT name, misread, misread_uncertainty, kept FROM dataset').all()).toEqual([
      { name: 'Old', misread: 0.01, misread_uncertainty: null, kept: null }
    ]);
  });

  it('applies the committed migrations, and finds nothing to do the second time', () => {
    migrateDatabase(db);
    migrateDatabase(db);
    expect(count('sample')).toBe(0);
    expect(count('__drizzle_migrations')).toBeGreaterThan(0);
  });
});

/** Writes a folder of migrations as drizzle-kit lays it out. */
function lay(...migrations: string[]): void {
  const entries = migrations.map((sql, idx) => {
    const tag = `000${idx}_step`;
    writeFileSync(join(folder, `${tag}.sql`), sql);
    return { idx, version: '6', when: 1000 + idx, tag, breakpoints: true };
  });
  writeFileSync(
    join(folder, 'meta', '_journal.json'),
    JSON.stringify({ version: '7', dialect: 'sqlite', entries })
  );
}

function count(table: string): number {
  return (db.$client.prepare(`SELECT count(*) AS n FROM ${table}`).get() as { n: number }).n;
}
