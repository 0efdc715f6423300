import { outboxMessage } from '$lib/server/db/schema';
import { readEnv } from '$lib/server/env';
import { sendMail } from '$lib/server/mail/send-mail';
import { createServer } from 'node:net';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';
import { startMailServer, type MailServer } from '../../../support/mail-server';

let mail: MailServer;
beforeAll(async () => void (mail = await startMailServer()));
afterAll(() => mail.stop());

const through = (url: string) => readEnv({ SMTP_URL: url, MAIL_FROM: 'Severalty <counts@example.org>' });
const letter = { to: 'ada@example.org', subject: 'Counts', text: 'Line one\n\nLine two, with ≥ and ü\n' };

describe('sendMail', () => {
  it('hands the message to the mail server as it is', async () => {
    const db = freshDatabase();
    expect(await sendMail(db, letter, through(mail.url))).toEqual({ ok: true });
    const got = await mail.to('ada@example.org');
    expect(got.subject).toBe('Counts');
    expect(got.text).toBe(letter.text);
    expect(got.html).toBe(false);
    expect(got.from?.text).toBe('"Severalty" <counts@example.org>');
    expect(db.select().from(outboxMessage).all()).toEqual([]);
  });

  it('offers an address that ends such mail, by one click where it has https', async () => {
    const list = async (unsubscribe: string) => {
      const to = `${unsubscribe.length}@example.org`;
      await sendMail(freshDatabase(), { ...letter, to, unsubscribe }, through(mail.url));
      const { headerLines } = await mail.to(to);
      return headerLines.filter(({ key }) => key.startsWith('list-')).map(({ line }) => line);
    };
    expect(await list('https://counts.example/unsubscribe/x')).toEqual([
      'List-Unsubscribe: <https://counts.example/unsubscribe/x>',
      'List-Unsubscribe-Post: List-Unsubscribe=One-Click'
    ]);
    expect(await list('http://localhost:1/u')).toEqual(['List-Unsubscribe: <http://localhost:1/u>']);
  });

  it.each([
    ['subject', { subject: 'Counts\r\nBcc: thief@example.org\r\n\r\nBody' }],
    ['address', { to: 'ada@example.org\r\nBcc: thief@example.org' }],
    ['address with a comma', { to: 'ada@example.org, thief@example.org' }],
    ['text', { text: 'a\r\n.\r\nRCPT TO:<thief@example.org>\r\n' }]
  ])('adds no header and no recipient out of a %s', async (_name, over) => {
    const before = mail.recipients.length;
    await sendMail(freshDatabase(), { ...letter, ...over }, through(mail.url));
    const envelopes = mail.recipients.slice(before);
    expect(envelopes.flat().filter((address) => address === 'thief@example.org')).toEqual([]);
    for (const message of mail.messages.slice(before)) {
      expect(message.headers.has('bcc')).toBe(false);
      expect(envelopes.every((list) => list.length === 1)).toBe(true);
    }
  });

  it('says that it was not sent when the server refuses or is not there, and logs no address', async () => {
    const written: string[] = [];
    const spy = vi.spyOn(process.stderr, 'write').mockImplementation((text) => {
      written.push(String(text));
      return true;
    });
    const refusing = await startMailServer({ refuse: true });
    const gone = createServer().listen(0, '127.0.0.1');
    await new Promise((resolve) => gone.once('listening', resolve));
    const { port } = gone.address() as { port: number };
    await new Promise((resolve) => gone.close(resolve));
    for (const url of [refusing.url, `smtp://127.0.0.1:${port}`])
      expect(await sendMail(freshDatabase(), letter, through(url))).toEqual({
        ok: false,
        reason: 'not-sent'
      });
    spy.mockRestore();
    await refusing.stop();
    expect(written.join('')).toMatch(/"code":"EENVELOPE","responseCode":550/);
    expect(written.join('')).toMatch(/ECONNREFUSED|ESOCKET/);
    expect(written.join('')).not.toMatch(/example\.org|Counts/);
  });

  it('puts it on the outbox page in local mode, and nowhere without a mail server', async () => {
    const db = freshDatabase();
    expect(await sendMail(db, letter, readEnv({}), 7)).toEqual({ ok: true });
    expect(db.select().from(outboxMessage).all()).toEqual([
      expect.objectContaining({ ...letter, createdAt: 7 })
    ]);
    const open = readEnv({ HOST: '0.0.0.0' });
    expect(await sendMail(db, letter, open)).toEqual({ ok: false, reason: 'no-mail-server' });
    expect(db.select().from(outboxMessage).all().length).toBe(1);
  });
});
