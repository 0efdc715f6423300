import type { Database } from '$lib/server/db/client';
import { membership } from '$lib/server/db/schema';
import type { Message } from '$lib/server/mail/send-mail';
import type { Actor } from '$lib/server/services/access/actor';
import { recordEvent } from '$lib/server/services/events/record-event';
import { deliverOnce } from '$lib/server/services/webhooks/deliver-once';
import { mailRested } from '$lib/server/services/webhooks/mail-rested';
import { eq } from 'drizzle-orm';
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

describe('a webhook that was put to rest after a week of failures', () => {
  it('is told to its maker while they lead, else to those who lead; once', async () => {
    const other = makeMember(db, teamId, 'lead');
    const sent: Message[] = [];
    const rested: string[] = [];
    listener.answerWith = () => 500;
    happens('first');
    for (const at of [NOW, NOW + 8 * DAY, NOW + 9 * DAY])
      await deliverOnce(
        db,
        HOOK_SETTINGS,
        () => false,
        () => at,
        (one) => rested.push(one)
      );
    expect(rested).toEqual([id]);
    const mail = () =>
      mailRested(db, id, 'https://counts.example', (_db, message) => {
        sent.push(message);
        return Promise.resolve({ ok: true });
      });
    await mail();
    expect(sent.map(({ to }) => to)).toEqual([`${lead.personId}@example.org`]);
    expect(sent[0].text).toContain('Every message failed for a week. The last time: It refused.');
    expect(sent[0].text).toContain(`https://counts.example/team/bay-side/webhooks/${id}`);
    db.update(membership).set({ role: 'observer' }).where(eq(membership.personId, lead.personId)).run();
    await mail();
    expect(sent.map(({ to }) => to).slice(1)).toEqual([`${other.personId}@example.org`]);
  });
});
