import type { Database } from '$lib/server/db/client';
import { webhook, webhookDelivery } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { claimDelivery, LEASE } from '$lib/server/services/webhooks/claim-delivery';
import { deliverOnce } from '$lib/server/services/webhooks/deliver-once';
import { gatherDeliveries } from '$lib/server/services/webhooks/gather-deliveries';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';
import { purgeDeliveries } from '$lib/server/services/webhooks/purge-deliveries';
import { settleDelivery } from '$lib/server/services/webhooks/settle-delivery';
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

describe('processes that end and clocks that move', () => {
  const first = () => {
    made();
    happens('gate.fail', 'first');
    gatherDeliveries(db, NOW);
  };

  it('give a message to one of two that ask', () => {
    first();
    expect(claimDelivery(db, NOW)).toMatchObject({ attempts: 1 });
    expect(claimDelivery(db, NOW)).toBeNull();
  });

  it('sends again what a process was sending when it was killed, and believes its note no more', () => {
    first();
    const lost = claimDelivery(db, NOW)!;
    expect(claimDelivery(db, NOW + LEASE - 1)).toBeNull();
    const again = claimDelivery(db, NOW + LEASE)!;
    expect(again).toMatchObject({ id: lost.id, attempts: 2 });
    settleDelivery(db, lost, { ok: true, answered: 200 }, NOW + LEASE);
    expect(rows()[0].status).toBe('waiting');
    settleDelivery(db, again, { ok: true, answered: 200 }, NOW + LEASE);
    expect(rows()[0]).toMatchObject({ status: 'sent', attempts: 2 });
  });

  it('loses nothing when killed before anything was gathered, and doubles nothing when it is gathered twice', async () => {
    first();
    expect(gatherDeliveries(db, NOW)).toBe(0);
    // As if the place reached had not been written.
    db.update(webhook).set({ lastEvent: 0 }).run();
    gatherDeliveries(db, NOW);
    expect(rows()).toHaveLength(1);
    await deliver(NOW);
    expect(listener.heard).toHaveLength(1);
  });

  it('sends after the clock was set back by a year', async () => {
    first();
    expect(await deliver(NOW - 365 * DAY)).toBe(1);
    expect(listener.heard).toHaveLength(1);
  });

  it('keeps what ended for 30 days, and what waits for ever', async () => {
    first();
    await deliver(NOW);
    happens('gate.fail', 'second');
    gatherDeliveries(db, NOW);
    expect(purgeDeliveries(db, NOW + 30 * DAY - 1)).toBe(0);
    expect(purgeDeliveries(db, NOW + 30 * DAY)).toBe(1);
    expect(rows().map(({ status }) => status)).toEqual(['waiting']);
  });
});
