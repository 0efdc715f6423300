import type { Database } from '$lib/server/db/client';
import { event, webhook, webhookDelivery } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { deliverOnce } from '$lib/server/services/webhooks/deliver-once';
import { gatherDeliveries } from '$lib/server/services/webhooks/gather-deliveries';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';
import { MOST_ATTEMPTS, retryDelay } from '$lib/server/services/webhooks/retry-delay';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { listen, type Listener } from '../../../../support/listen';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const NOW = Date.UTC(2026, 2, 14, 15, 9, 26);
const DAY = 86_400_000;
const settings = { serverSecret: 'an invented key of the server, long enough', allowInner: true };

let db: Database;
let teamId: string;
let lead: Actor;
let listener: Listener;

beforeEach(async () => {
  db = freshDatabase();
  teamId = makeTeam(db, 'bay-side').id;
  lead = makeMember(db, teamId, 'lead');
  listener = await listen();
});
afterEach(() => listener.close());

function made(now = NOW): { id: string; secret: string } {
  const form = {
    name: 'listener',
    url: listener.url,
    actions: ['gate.fail' as const, 'remark.add' as const]
  };
  const result = makeWebhook(db, lead, form, settings, now);
  if (!result.ok) throw new Error(result.reason);
  return result;
}
const happens = (action: string, thing: string, detail = {}) =>
  recordEvent(db, { action, teamId, personId: lead.personId, thing, detail }, NOW);
const deliver = (now: number) =>
  deliverOnce(
    db,
    settings,
    () => false,
    () => now
  );
const rows = () => db.select().from(webhookDelivery).orderBy(webhookDelivery.eventId).all();

describe('what a webhook is told', () => {
  it('is what it asked for, of its own team, since it was made, once, in order', async () => {
    happens('gate.fail', 'before');
    made();
    const stranger = makeTeam(db).id;
    recordEvent(db, { action: 'gate.fail', teamId: stranger, thing: 'strange' }, NOW);
    happens('gate.fail', 'first', { version: 'ebb 3.3' });
    happens('gate.pass', 'not asked for');
    happens('gate.fail', 'second');
    await deliver(NOW);
    await deliver(NOW + DAY);
    const bodies = listener.heard.map(
      ({ body }) => JSON.parse(body) as { type: string; data: { thing: string } }
    );
    expect(bodies.map(({ data }) => data.thing)).toEqual(['first', 'second']);
    expect(bodies[0]).toMatchObject({
      type: 'gate.fail',
      timestamp: '2026-03-14T15:09:26.000Z',
      data: { team: 'bay-side', facts: { version: 'ebb 3.3' } }
    });
    expect(rows().map(({ status, answered }) => [status, answered])).toEqual([
      ['sent', 204],
      ['sent', 204]
    ]);
  });

  it('names nobody, and of a remark neither its section nor its link', async () => {
    made();
    happens('remark.add', 'a report', { section: 'fit', link: 'the link of referee two' });
    await deliver(NOW);
    expect(listener.heard[0].body).not.toContain(lead.personId);
    expect(listener.heard[0].body).not.toMatch(/referee two|fit/);
  });

  it('is nothing while it rests', async () => {
    const { id } = made();
    happens('gate.fail', 'first');
    gatherDeliveries(db, NOW);
    db.update(webhook).set({ restingSince: NOW, restingWhy: 'by hand' }).run();
    happens('gate.fail', 'second');
    expect(await deliver(NOW)).toBe(0);
    expect(rows().map((row) => [row.webhookId, row.status])).toEqual([[id, 'waiting']]);
  });
});

describe('an attempt that fails', () => {
  it('is made again later with the same id and a moment of its own, and those behind it wait', async () => {
    made();
    happens('gate.fail', 'first');
    happens('gate.fail', 'second');
    const answers = [503, 302, null];
    listener.answerWith = () => (answers.length > 0 ? answers.shift()! : 200);
    let now = NOW;
    const waits: number[] = [];
    while (rows().length === 0 || rows().some(({ status }) => status === 'waiting')) {
      await deliver(now);
      const due = rows()[0].dueAt;
      if (due === null) continue;
      waits.push(due - now);
      now = due;
    }
    expect(
      listener.heard.map(({ body }) => (JSON.parse(body) as { data: { thing: string } }).data.thing)
    ).toEqual(['first', 'first', 'first', 'first', 'second']);
    expect(new Set(listener.heard.map(({ headers }) => headers['webhook-id'])).size).toBe(2);
    expect(new Set(listener.heard.slice(0, 4).map(({ headers }) => headers['webhook-timestamp'])).size).toBe(
      4
    );
    waits.forEach((wait, k) => {
      expect(wait).toBeGreaterThanOrEqual(8_000 * 3 ** k);
      expect(wait).toBeLessThanOrEqual(12_000 * 3 ** k);
    });
  });

  it('is given up after about three days', async () => {
    made();
    happens('gate.fail', 'first');
    listener.answerWith = () => 500;
    let now = NOW;
    for (let k = 0; k < MOST_ATTEMPTS; k++) {
      expect(await deliver(now)).toBe(1);
      now = rows()[0].dueAt ?? now;
    }
    expect(rows()[0]).toMatchObject({
      status: 'given-up',
      attempts: MOST_ATTEMPTS,
      answered: 500,
      dueAt: null
    });
    expect(await deliver(now + DAY)).toBe(0);
    expect((now - NOW) / DAY).toBeGreaterThan(2.2);
    expect((now - NOW) / DAY).toBeLessThan(3.6);
    const plain = Array.from({ length: MOST_ATTEMPTS - 1 }, (_, k) => retryDelay(k + 1, 0.5));
    // 10 s × (3⁷ − 1)/2 + 21 870 s would be 3⁷; the eighth wait and all after it are 6 h.
    expect(plain.reduce((sum, wait) => sum + wait, 0)).toBe(10_000 * ((3 ** 7 - 1) / 2) + 11 * 6 * 3_600_000);
  });

  it('for a week puts the webhook to rest, and no earlier', async () => {
    const { id } = made();
    listener.answerWith = () => 500;
    happens('gate.fail', 'first');
    await deliver(NOW);
    const state = () => db.select().from(webhook).get();
    await deliver(NOW + 7 * DAY - 1);
    expect(state()?.restingSince).toBeNull();
    await deliver(NOW + 7 * DAY + DAY);
    expect(state()).toMatchObject({ id, restingSince: NOW + 8 * DAY });
    expect(state()?.restingWhy).toContain('week');
    expect(db.select().from(event).all().at(-1)).toMatchObject({ action: 'webhook.rest', thing: id });
  });
});
