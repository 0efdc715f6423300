import { mkdtempSync, rmSync } from 'node:fs';
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
  db.$client.close();
  rmSync(folder, { recursive: true, force: true });
});
