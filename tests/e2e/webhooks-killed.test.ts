import { webhookDelivery } from '$lib/server/db/schema';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';
import { eq } from 'drizzle-orm';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { listen, type Listener } from '../support/listen';
import { seedPerson, seedTeam, withDatabaseOf } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

const data = mkdtempSync(join(tmpdir(), 'severalty-hooks-'));
const servers: RunningServer[] = [];
let listener: Listener;
let actor: Actor;

/** A server on the one data folder of this file; its webhooks may knock at this machine. */
async function another(): Promise<RunningServer> {
  const server = await startServer({ SEVERALTY_DATA: data, WEBHOOKS_INSIDE: 'yes' });
  servers.push(server);
  return server;
}

beforeAll(async () => {
  listener = await listen();
  const server = await another();
  const lead = await seedPerson(server);
  const team = await seedTeam(server, 'killed', [[lead, 'lead']]);
  actor = { personId: lead.id, teamId: team.id, role: 'lead' };
  const serverSecret = readFileSync(join(data, 'auth-secret'), 'utf8');
  const form = { name: 'listener', url: listener.url, actions: ['gate.fail' as const] };
  await withDatabaseOf(server, (db) => {
    const made = makeWebhook(db, actor, form, { serverSecret, allowInner: true });
    if (!made.ok) throw new Error(made.reason);
  });
});

afterAll(async () => {
  for (const server of servers) await server.kill();
  listener?.close();
  rmSync(data, { recursive: true, force: true });
});

const happen = (db: Database, from: number, to: number) => {
  for (let k = from; k < to; k++)
    recordEvent(db, { action: 'gate.fail', teamId: actor.teamId, thing: `version ${k}`, detail: {} });
};
const things = () =>
  listener.heard.map(({ body }) => (JSON.parse(body) as { data: { thing: string } }).data.thing);
const named = (from: number, to: number) =>
  Array.from({ length: to - from }, (_, k) => `version ${from + k}`);

it('a server that is killed between two messages loses none, and sends at most the one under way twice', async () => {
  const [first] = servers;
  let killed: Promise<void> | null = null;
  listener.answerWith = () => {
    // The eighth message is heard, and its sender gone before it notes the answer.
    if (listener.heard.length === 8) killed = first.kill();
    return killed ? null : 204;
  };
  await withDatabaseOf(first, (db) => happen(db, 0, 20));
  await expect.poll(() => killed !== null, { timeout: 30_000 }).toBe(true);
  await killed;
  expect(things()).toEqual(named(0, 8));
  await withDatabaseOf({ data }, (db) => {
    const rows = db.select().from(webhookDelivery).orderBy(webhookDelivery.eventId).all();
    expect(rows.filter(({ status }) => status === 'sent')).toHaveLength(7);
    // What a killed process was sending is free again after a minute: this is that minute later.
    db.update(webhookDelivery).set({ dueAt: 1 }).where(eq(webhookDelivery.status, 'waiting')).run();
  });
  listener.answerWith = () => 204;
  await another();
  await expect.poll(() => new Set(things()).size, { timeout: 30_000 }).toBe(20);
  expect(things()).toEqual([...named(0, 8), ...named(7, 20)]);
  // The one that came twice has one id, so its receiver can tell.
  const ids = listener.heard.map(({ headers }) => headers['webhook-id']);
  expect(ids[7]).toBe(ids[8]);
  expect(new Set(ids).size).toBe(20);
}, 90_000);

it('of two servers on one database one sends each message, in order', async () => {
  const before = listener.heard.length;
  const second = await another();
  await withDatabaseOf(second, (db) => happen(db, 20, 80));
  await expect.poll(() => listener.heard.length - before, { timeout: 60_000 }).toBe(60);
  expect(things().slice(before)).toEqual(named(20, 80));
  await withDatabaseOf(second, (db) => {
    const rows = db.select().from(webhookDelivery).all();
    expect(rows.filter(({ status }) => status === 'sent')).toHaveLength(80);
    expect(rows.filter(({ attempts }) => attempts > 1)).toHaveLength(1);
  });
}, 90_000);
