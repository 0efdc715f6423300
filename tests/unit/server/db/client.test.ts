import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { databaseFile, openDatabase } from '$lib/server/db/client';

it('opens with a write-ahead log, foreign keys on and patience for another writer', () => {
  const folder = mkdtempSync(join(tmpdir(), 'severalty-client-'));
  const db = openDatabase(databaseFile(join(folder, 'made', 'on', 'the', 'way')));
  const pragma = (name: string) => db.$client.pragma(name, { simple: true });
  expect(pragma('journal_mode')).toBe('wal');
  expect(pragma('foreign_keys')).toBe(1);
  expect(pragma('busy_timeout')).toBe(5000);
  // 1 is NORMAL.
  expect(pragma('synchronous')).toBe(1);
  // Password hashes and counts are for the owner's eyes, the log beside the database included.
  const file = databaseFile(join(folder, 'made', 'on', 'the', 'way'));
  db.$client.exec('create table written (x)');
  for (const name of [file, `${file}-wal`]) expect(statSync(name).mode & 0o777).toBe(0o600);
  db.$client.close();
  rmSync(folder, { recursive: true, force: true });
});
