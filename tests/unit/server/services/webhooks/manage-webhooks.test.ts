import type { Database } from '$lib/server/db/client';
import { event, webhook, webhookDelivery } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { listEvents } from '$lib/server/services/events/list-events';
import { deleteWebhook } from '$lib/server/services/webhooks/delete-webhook';
import { deliverOnce } from '$lib/server/services/webhooks/deliver-once';
import { listDeliveries } from '$lib/server/services/webhooks/list-deliveries';
import { listWebhooks, readWebhook } from '$lib/server/services/webhooks/list-webhooks';
import { resendDelivery } from '$lib/server/services/webhooks/resend-delivery';
import { restWebhook } from '$lib/server/services/webhooks/rest-webhook';
import { tryWebhook } from '$lib/server/services/webhooks/try-webhook';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { listen, type Listener } from '../../../../support/listen';
import { makeMember, makeTeam } from '../../../../support/people';
import { HOOK_SETTINGS, madeWebhook } from '../../../../support/webhooks';

const NOW = Date.UTC(2026, 2, 14, 15, 9, 26);
const DAY = 86_400_000;

let db: Database;
let teamId: string;
let lead: Actor;
let listener: Listener;
let id: string;

beforeEach(async () => {
  db = freshDatabase();
  teamId = makeTeam(db, 'bay-side').id;
  lead = makeMember(db, teamId, 'lead');
  listener = await listen();
  ({ id } = madeWebhook(db, lead, listener.url, NOW));
});
afterEach(() => listener.close());

const happens = (thing: string, at = NOW) =>
  recordEvent(db, { action: 'gate.fail', teamId, thing, detail: {} }, at);
const deliver = (now: number) =>
  deliverOnce(
    db,
    HOOK_SETTINGS,
    () => false,
    () => now
  );
const rows = () => db.select().from(webhookDelivery).orderBy(webhookDelivery.eventId).all();
const things = () =>
  listener.heard.map(({ body }) => (JSON.parse(body) as { data: { thing: string } }).data.thing);

describe('webhooks are for leads', () => {
  it('and are not there for anybody else', async () => {
    happens('first');
    await deliver(NOW);
    const [{ id: deliveryId }] = rows();
    const elsewhere = makeTeam(db).id;
    const others = [
      makeMember(db, teamId, 'experimenter'),
      makeMember(db, teamId, 'observer'),
      makeMember(db, elsewhere, 'lead'),
      { ...makeMember(db, elsewhere, 'lead'), teamId },
      { ...lead, token: { id: 't', name: 'nightly', role: 'experimenter' as const } }
    ];
    for (const actor of others) {
      expect(listWebhooks(db, actor)).toEqual([]);
      expect(readWebhook(db, actor, id)).toBeNull();
      expect(listDeliveries(db, actor, id, { limit: 9 })).toEqual({ deliveries: [], next: null });
      const unknown = { ok: false, reason: 'unknown' };
      expect(restWebhook(db, actor, id, true)).toEqual(unknown);
      expect(tryWebhook(db, actor, id)).toEqual(unknown);
      expect(resendDelivery(db, actor, { webhookId: id, deliveryId })).toEqual(unknown);
      expect(deleteWebhook(db, actor, id)).toEqual(unknown);
    }
    expect(listWebhooks(db, lead)).toMatchObject([{ id, waiting: 0, lastSentAt: NOW }]);
    expect(JSON.stringify(listWebhooks(db, lead))).not.toMatch(/secret|sealed/i);
    expect(rows()).toMatchObject([{ status: 'sent' }]);
  });
});

describe('a webhook that rests', () => {
  it('is told nothing of what happened meanwhile when it wakes, but what waited before', async () => {
    listener.answerWith = () => 500;
    happens('waited');
    await deliver(NOW);
    expect(restWebhook(db, lead, id, true, NOW)).toMatchObject({ ok: true, changed: true });
    expect(restWebhook(db, lead, id, true, NOW)).toMatchObject({ ok: true, changed: false });
    happens('while it rested');
    listener.answerWith = () => 200;
    expect(await deliver(NOW + DAY)).toBe(0);
    expect(restWebhook(db, lead, id, false, NOW + DAY)).toMatchObject({ ok: true, changed: true });
    happens('afterwards');
    await deliver(NOW + DAY);
    expect(things()).toEqual(['waited', 'waited', 'afterwards']);
    const said = listEvents(db, lead).events.map(({ words }) => words);
    expect(said.filter((words) => words.includes('listener'))).toEqual([
      'Ada Invented woke the webhook “listener”',
      'Ada Invented put the webhook “listener” to rest',
      'Ada Invented made the webhook “listener”'
    ]);
  });

  it('is not put to rest again by the first failure after it was woken', async () => {
    listener.answerWith = () => 500;
    happens('first');
    await deliver(NOW);
    await deliver(NOW + 8 * DAY);
    expect(db.select().from(webhook).get()?.restingSince).toBe(NOW + 8 * DAY);
    restWebhook(db, lead, id, false, NOW + 20 * DAY);
    happens('second');
    expect(await deliver(NOW + 20 * DAY)).toBe(1);
    expect(db.select().from(webhook).get()?.restingSince).toBeNull();
    await deliver(NOW + 27 * DAY);
    expect(db.select().from(webhook).get()?.restingSince).toBe(NOW + 27 * DAY);
  });

  it('sends nothing that is asked for by hand', async () => {
    happens('first');
    await deliver(NOW);
    const [{ id: deliveryId }] = rows();
    restWebhook(db, lead, id, true, NOW);
    expect(tryWebhook(db, lead, id, NOW)).toEqual({ ok: false, reason: 'resting' });
    expect(resendDelivery(db, lead, { webhookId: id, deliveryId }, NOW)).toEqual({
      ok: false,
      reason: 'resting'
    });
  });
});

describe('by hand', () => {
  it('a trial message is signed, goes before those that wait, and is tried once', async () => {
    listener.answerWith = () => 500;
    happens('waits');
    await deliver(NOW);
    expect(tryWebhook(db, lead, id, NOW)).toMatchObject({ ok: true });
    expect(tryWebhook(db, lead, id, NOW + 1)).toEqual({ ok: false, reason: 'too-soon' });
    expect(await deliver(NOW)).toBe(1);
    expect(rows()).toMatchObject([
      { action: 'gate.fail', status: 'waiting' },
      { action: 'webhook.try', status: 'given-up', answered: 500, attempts: 1 }
    ]);
    expect(listener.heard[1].headers['webhook-signature']).toMatch(/^v1,/);
    expect(things()).toEqual(['waits', id]);
  });

  it('a message is sent again under its id, and tried this once; another webhook does not know it', async () => {
    happens('first');
    await deliver(NOW);
    const [{ id: deliveryId }] = rows();
    const other = madeWebhook(db, lead, listener.url, NOW).id;
    expect(resendDelivery(db, lead, { webhookId: other, deliveryId }, NOW).ok).toBe(false);
    listener.answerWith = () => 503;
    expect(resendDelivery(db, lead, { webhookId: id, deliveryId }, NOW)).toEqual({ ok: true });
    await deliver(NOW);
    const ids = listener.heard.map(({ headers }) => headers['webhook-id']);
    expect(ids).toEqual([deliveryId, deliveryId]);
    expect(rows()).toMatchObject([{ status: 'given-up', attempts: 2, answered: 503, byHand: false }]);
  });

  it('one that waits is sent now and keeps its later tries; one under way is left alone', async () => {
    listener.answerWith = () => 500;
    happens('first');
    for (let k = 0, now = NOW; k < 4; k++) {
      await deliver(now);
      now = rows()[0].dueAt ?? now;
    }
    const [{ id: deliveryId, dueAt }] = rows();
    const which = { webhookId: id, deliveryId };
    expect(resendDelivery(db, lead, which, dueAt! - 1)).toEqual({ ok: false, reason: 'under-way' });
    const soon = dueAt! - 3 * 60_000;
    expect(resendDelivery(db, lead, which, soon)).toEqual({ ok: true });
    expect(await deliver(soon)).toBe(1);
    expect(rows()).toMatchObject([{ status: 'waiting', attempts: 5 }]);
  });
});

it('a webhook that is removed takes its messages along', async () => {
  happens('first');
  await deliver(NOW);
  expect(deleteWebhook(db, lead, id)).toEqual({ ok: true, name: 'listener' });
  expect(rows()).toEqual([]);
  expect(db.select().from(event).all().at(-1)).toMatchObject({ action: 'webhook.delete', thing: id });
});

it('messages come in pages by the number of their event, of one status where asked', async () => {
  for (let k = 0; k < 7; k++) happens(`thing ${k}`);
  await deliver(NOW);
  const seen: string[] = [];
  let before: number | undefined;
  do {
    const { deliveries, next } = listDeliveries(db, lead, id, { limit: 3, before });
    seen.push(...deliveries.map(({ body }) => /thing \d/.exec(body)![0]));
    before = next ?? undefined;
  } while (before !== undefined);
  expect(seen).toEqual([6, 5, 4, 3, 2, 1, 0].map((k) => `thing ${k}`));
  expect(listDeliveries(db, lead, id, { limit: 9, status: 'waiting' }).deliveries).toEqual([]);
});
