import { openDatabase, type Database } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { askLink, askLinkJson } from '../../../../src/routes/ask-link';
import { linked, shared } from '../../../support/links';

let folder: string;
let db: Database;
let other: Database;
let token: string;

beforeEach(async () => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-ask-link-'));
  const file = join(folder, 'test.sqlite');
  db = openDatabase(file);
  migrateDatabase(db);
  other = openDatabase(file);
  // The waiting is not what is tested.
  db.$client.pragma('busy_timeout = 20');
  const { lead, reportId } = await shared(db);
  token = linked(db, lead, reportId, { visitLimit: 1 }).token;
});

afterEach(() => {
  db.$client.close();
  other.$client.close();
  rmSync(folder, { recursive: true });
});

function asked(method = 'GET') {
  const url = new URL(`https://counts.example/link/${token}`);
  const kept = new Map<string, string>();
  const cookies = {
    get: (name: string) => kept.get(name),
    set: (name: string, value: string) => void kept.set(name, value)
  };
  const event = {
    locals: { db, person: null },
    cookies,
    url,
    request: new Request(url, { method }),
    params: { token }
  };
  return { event: event as unknown as Parameters<typeof askLink>[0], kept };
}

const visits = () => db.$client.prepare('select outcome from link_visit').all();

describe('a link while another process holds the database', () => {
  beforeEach(() => void other.$client.exec('begin immediate'));

  it('is answered with 503 and words on its page', () => {
    expect(() => askLink(asked().event, 'see')).toThrow(
      expect.objectContaining({
        status: 503,
        body: { code: 'busy', message: expect.stringContaining('Try again in a moment.') as string }
      })
    );
  });

  it('is answered with 503 and problem details as JSON, and opens once the lock is gone', async () => {
    const answer = askLinkJson(asked().event, 'see');
    if (answer.ok) throw new Error('opened');
    const { response } = answer;
    expect([response.status, response.headers.get('content-type')]).toEqual([
      503,
      'application/problem+json'
    ]);
    expect(await response.json()).toMatchObject({
      code: 'busy',
      title: expect.stringContaining('busy') as string
    });
    other.$client.exec('rollback');
    expect(visits()).toEqual([]);
    expect(askLinkJson(asked().event, 'see').ok).toBe(true);
  });
});

describe('HEAD', () => {
  it('counts no visit and leaves no cookie, so that the one visit is still to come', () => {
    const head = asked('HEAD');
    expect(askLink(head.event, 'see').ok).toBe(true);
    expect([visits(), head.kept.size]).toEqual([[], 0]);
    const get = asked();
    expect(askLink(get.event, 'see').ok).toBe(true);
    expect([visits(), get.kept.size]).toEqual([[{ outcome: 'opened' }], 1]);
    expect(() => askLink(asked('HEAD').event, 'see')).toThrow(expect.objectContaining({ status: 410 }));
    expect(visits()).toHaveLength(1);
  });
});
