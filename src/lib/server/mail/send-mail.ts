import type { Database } from '../db/client';
import { newId } from '../db/new-id';
import { outboxMessage } from '../db/schema';
import { isLocal, readEnv, type Env } from '../env';
import { log } from '../log';
import { transportFor } from './transport';

export interface Message {
  to: string;
  subject: string;
  /** Plain text, lines of any length. */
  text: string;
  /** Address that ends such mail, for the reader's program to offer. */
  unsubscribe?: string;
}

export type SendMail =
  | { ok: true }
  /** `no-mail-server`: none is set up, and this is not local mode. `not-sent`: it was unreachable or refused. */
  | { ok: false; reason: 'no-mail-server' | 'not-sent' };

/**
 * Sends one message, and waits until the mail server has taken it. In local mode it is put on the outbox page instead.
 * Never throws: what to do about mail that did not go is for the caller to say.
 */
export async function sendMail(
  db: Database,
  message: Message,
  env: Env = readEnv(),
  now = Date.now()
): Promise<SendMail> {
  const { to, text } = message;
  const subject = oneLine(message.subject);
  if (!env.SMTP_URL) {
    if (!isLocal(env)) return { ok: false, reason: 'no-mail-server' };
    db.insert(outboxMessage).values({ id: newId(), to, subject, text, createdAt: now }).run();
    return { ok: true };
  }
  try {
    // An address as an object is never parsed, so a comma or a line end in it adds no other recipient.
    await transportFor(env.SMTP_URL).sendMail({
      from: env.MAIL_FROM,
      to: { name: '', address: oneLine(to) },
      subject,
      text,
      ...(message.unsubscribe ? { headers: unsubscribing(message.unsubscribe) } : {})
    });
    return { ok: true };
  } catch (error) {
    // The server's answer may repeat the message, so only its code goes into the log.
    const { code, responseCode } = error as { code?: string; responseCode?: number };
    log('error', 'Mail was not sent.', { code, responseCode });
    return { ok: false, reason: 'not-sent' };
  }
}

/** RFC 2369, and RFC 8058: one click, which takes an address with https. */
const unsubscribing = (address: string): Record<string, string> => ({
  'List-Unsubscribe': `<${address}>`,
  ...(address.startsWith('https:') ? { 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' } : {})
});

/** Names and subjects come from people: a line end in one would begin a header of their choosing. */
const oneLine = (text: string) =>
  text
    .replace(/[\p{Cc}\u2028\u2029]+/gu, ' ')
    .trim()
    .slice(0, 300);
