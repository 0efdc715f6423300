import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openDatabase, type Database } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { projectFolder } from '$lib/server/project-folder';

let folder: string;
let db: Database;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-links-'));
  cpSync(join(projectFolder(), 'drizzle'), folder, { recursive: true });
  const file = join(folder, 'meta/_journal.json');
  const journal = JSON.parse(readFileSync(file, 'utf8'));
  journal.entries = journal.entries.slice(0, 6);
  writeFileSync(file, JSON.stringify(journal));
  db = openDatabase(':memory:');
  migrateDatabase(db, folder);
});

afterEach(() => {
  db.$client.close();
  rmSync(folder, { recursive: true, force: true });
});

/** Rows of a link and of everything that hangs on it, as the release before wrote them. */
const ROWS = `
INSERT INTO team (id, name, slug, created_at) VALUES ('t', 'Wrackline', 'wrackline', 1);
INSERT INTO original_file VALUES ('f', 't', 'a.csv', 'd', 1, x'30', 1);
INSERT INTO dataset (id, team_id, name, file_id, reading, counts, kind, digest, shots, mean, largest, geometry, unit, created_at, updated_at)
  VALUES ('d', 't', 'A', 'f', '{}', '{}', 'histogram', 'x', 1, 0, 0, 'sites', 'defect', 1, 1);
INSERT INTO report (id, team_id, dataset_id, number, document, sha256, options, engine_version, verdict, conditions, created_at)
  VALUES ('r', 't', 'd', 1, '{}', 'x', '{}', '0', 'undecided', '{}', 1);
INSERT INTO link (id, team_id, report_id, token_hash, label, audience, shows, blind, hides_referees, allows_remarks, created_at)
  VALUES ('l', 't', 'r', 'hash', 'referee 2', 'anyone', 'report', 1, 0, 1, 7);
INSERT INTO link_visit (id, link_id, at, outcome) VALUES ('v', 'l', 8, 'opened');
INSERT INTO remark (id, report_id, section, body, link_id, signed_as, created_at) VALUES ('k', 'r', 'answer', 'Why?', 'l', 'R2', 9);`;

describe('links made before there were sweeps', () => {
  it('keep their report, their visits and their remarks when the table is rebuilt', () => {
    db.$client.exec(ROWS);
    migrateDatabase(db);
    expect(db.$client.prepare('SELECT * FROM link').all()).toMatchObject([
      { id: 'l', report_id: 'r', sweep_id: null, token_hash: 'hash', blind: 1, created_at: 7 }
    ]);
    expect(db.$client.prepare('SELECT link_id FROM link_visit').all()).toEqual([{ link_id: 'l' }]);
    expect(db.$client.prepare('SELECT link_id FROM remark').all()).toEqual([{ link_id: 'l' }]);
  });

  it('open one thing each: neither none nor two', () => {
    db.$client.exec(ROWS);
    migrateDatabase(db);
    const set = (report: string, sweep: string) =>
      db.$client.exec(`UPDATE link SET report_id = ${report}, sweep_id = ${sweep}`);
    expect(() => set('NULL', 'NULL')).toThrow(/link_opens_one/);
    expect(() => set("'r'", "'s'")).toThrow(/link_opens_one/);
  });
});
