import type { ToldAction } from '$lib/model/webhooks/told-actions';
import type { Database } from '$lib/server/db/client';
import { newId } from '$lib/server/db/new-id';
import { webhookDelivery } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { makeWebhook } from '$lib/server/services/webhooks/make-webhook';

export const HOOK_SETTINGS = {
  serverSecret: 'an invented key of the server, long enough',
  allowInner: true
};

/** What a script sends to make a webhook. */
export const HOOK_BODY = JSON.stringify({
  name: 'H',
  url: 'https://example.org/hook',
  actions: ['gate.fail']
});

/** A webhook of the actor's team that is told of failed gates and of remarks. */
export function madeWebhook(
  db: Database,
  actor: Actor,
  url: string,
  now: number,
  actions: ToldAction[] = ['gate.fail', 'remark.add']
): { id: string; secret: string } {
  const made = makeWebhook(db, actor, { name: 'listener', url, actions }, HOOK_SETTINGS, now);
  if (!made.ok) throw new Error(made.reason);
  return made;
}

/** A webhook with a message of each kind, to look at. @returns its id */
export function hookOf(db: Database, actor: Actor, now = Date.now()): string {
  const { id } = madeWebhook(db, actor, 'https://listener.example/severalty/invented-bay-side-chain', now);
  const body = JSON.stringify({ type: 'gate.fail', timestamp: new Date(now).toISOString(), data: {} });
  const row = { webhookId: id, action: 'gate.fail', body, createdAt: now };
  const trouble = 'It did not answer within 10 s.';
  const ended = { answered: 204, attempts: 1, endedAt: now };
  const messages = [
    { status: 'sent' as const, ...ended },
    { status: 'given-up' as const, ...ended, answered: 503, trouble: 'It refused.', attempts: 19 },
    { status: 'waiting' as const, trouble, attempts: 3, dueAt: now + 3_600_000 }
  ];
  messages.forEach((message, i) => {
    db.insert(webhookDelivery)
      .values({ ...row, ...message, id: newId(), eventId: 1_000_000 + i })
      .run();
  });
  return id;
}
