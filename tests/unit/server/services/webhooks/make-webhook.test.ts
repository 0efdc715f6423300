import { webhookFormSchema } from '$lib/model/webhooks/webhook-form';
import { event, webhook } from '$lib/server/db/schema';
import { isInnerAddress } from '$lib/server/services/webhooks/is-inner-address';
import { makeWebhook, MOST_WEBHOOKS } from '$lib/server/services/webhooks/make-webhook';
import { openSecret } from '$lib/server/services/webhooks/open-secret';
import { sendMessage } from '$lib/server/services/webhooks/send-message';
import { signMessage } from '$lib/server/services/webhooks/sign-message';
import { execFileSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const serverSecret = 'an invented key of the server, long enough';
const form = { name: 'listener', url: 'https://example.org/hook', actions: ['gate.fail' as const] };
const outer = { serverSecret, allowInner: false };

describe('a webhook', () => {
  it('is made by leads, and its secret is kept sealed alone', () => {
    const db = freshDatabase();
    const { id: teamId } = makeTeam(db);
    for (const role of ['experimenter', 'observer'] as const)
      expect(makeWebhook(db, makeMember(db, teamId, role), form, outer)).toEqual({
        ok: false,
        reason: 'not-allowed'
      });
    const lead = makeMember(db, teamId, 'lead');
    expect(makeWebhook(db, { ...lead, teamId: makeTeam(db).id }, form, outer).ok).toBe(false);
    const made = makeWebhook(db, lead, form, outer);
    if (!made.ok) throw new Error(made.reason);
    expect(Buffer.from(made.secret.slice(6), 'base64')).toHaveLength(32);
    const row = db.select().from(webhook).get()!;
    expect(JSON.stringify([row, db.select().from(event).all()])).not.toContain(made.secret.slice(6));
    expect(openSecret(row.sealedSecret, made.id, serverSecret)).toBe(made.secret);
    expect(openSecret(row.sealedSecret, made.id, 'another key of the server, long enough')).toBeNull();
    expect(openSecret(row.sealedSecret, 'another row', serverSecret)).toBeNull();
    for (let k = 1; k < MOST_WEBHOOKS; k++) expect(makeWebhook(db, lead, form, outer).ok).toBe(true);
    expect(makeWebhook(db, lead, form, outer)).toEqual({ ok: false, reason: 'too-many' });
  });

  it('refuses addresses that are none, carry a password, or lie inside', () => {
    const url = (text: string) => webhookFormSchema.safeParse({ ...form, url: text }).success;
    expect(
      ['ftp://example.org', 'example.org', 'https://a:b@example.org', 'file:///x', ''].filter(url)
    ).toEqual([]);
    expect(url(`https://example.org/${'x'.repeat(1000)}`)).toBe(false);
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    // Also as browsers and URL read them: whole numbers, octal, IPv4 within IPv6.
    for (const host of [
      'localhost',
      'a.localhost',
      '127.0.0.1',
      '127.1',
      '2130706433',
      '0x7f.0.0.1',
      '10.1.2.3',
      '172.31.0.1',
      '192.168.0.1',
      '169.254.169.254',
      '100.64.0.1',
      '0.0.0.0',
      '[::1]',
      '[::]',
      '[fd00::1]',
      '[fe80::1]',
      '[::ffff:127.0.0.1]',
      '[64:ff9b::7f00:1]'
    ])
      expect(makeWebhook(db, lead, { ...form, url: `http://${host}/` }, outer), host).toEqual({
        ok: false,
        reason: 'inner-address'
      });
    expect(['93.184.215.14', '172.32.0.1', '8.8.8.8', '2606:2800::1'].filter(isInnerAddress)).toEqual([]);
  });

  it('looks its host up when it sends, and goes to nothing inside', async () => {
    const sent = await sendMessage('http://localhost:9/', {}, '{}', { allowInner: false });
    expect(sent).toMatchObject({ ok: false, answered: null });
    expect(!sent.ok && sent.trouble).toContain('inside');
    const open = await sendMessage('http://127.0.0.1:9/', {}, '{}', { allowInner: true });
    expect(!open.ok && open.trouble).toBe('Nobody listens there.');
  });
});

describe('the signature', () => {
  it('is that of the example which implementations of Standard Webhooks hold themselves to', () => {
    // Secret, id, moment and body of the test suite of the specification's reference libraries.
    const fields = signMessage(
      'whsec_MfKQ9r8GKYqrTwjUPD8ILPZIo2LaLaSw',
      'msg_p5jXN8AQM9LWM0D4loKWxJek',
      1_614_265_330_000,
      '{"test": 2432232314}'
    );
    expect(fields).toEqual({
      'webhook-id': 'msg_p5jXN8AQM9LWM0D4loKWxJek',
      'webhook-timestamp': '1614265330',
      'webhook-signature': 'v1,g0hM9SsE+OTPJTGt/tmIKtSyZlE3uFJELVlNIOLJ1OE='
    });
  });

  it('is what openssl makes of the same key', () => {
    const secret = `whsec_${Buffer.alloc(32, 7).toString('base64')}`;
    const macopt = `hexkey:${'07'.repeat(32)}`;
    const input = 'id.1700000000.{"é":1}';
    const mac = execFileSync('openssl', ['dgst', '-sha256', '-mac', 'HMAC', '-macopt', macopt, '-binary'], {
      input
    });
    expect(signMessage(secret, 'id', 1_700_000_000_999, '{"é":1}')['webhook-signature']).toBe(
      `v1,${mac.toString('base64')}`
    );
  });
});
