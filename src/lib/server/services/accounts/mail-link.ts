import { and, eq, isNull, lt } from 'drizzle-orm';
import { spendAttempt } from '../../auth/limits';
import { newToken } from '../../auth/new-token';
import { normalEmail } from '../../auth/normal-email';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { mailedToken, person } from '../../db/schema';
import { sendMail } from '../../mail/send-mail';
import { linkMail, nobodyMail } from './link-mail';
import { MINUTES, type Purpose } from './mailed-purposes';

export type MailLink =
  | { ok: true }
  | { ok: false; reason: 'wait'; seconds: number }
  | { ok: false; reason: 'no-mail-server' | 'not-sent' };

/**
 * Mails a link to sign in with, or to choose a new password with. One message goes out whether or not anybody has the
 * address, so neither the answer nor its time tells; who asks for a new password and has no account is told by mail.
 *
 * @param asked.then own path to go on to
 * @param origin of this application, as people type it
 */
export async function mailLink(
  db: Database,
  asked: { purpose: Purpose; email: string; then: string },
  { client, origin }: { client: string; origin: string },
  now = Date.now()
): Promise<MailLink> {
  const email = normalEmail(asked.email);
  const spent = await spendAttempt('mail', { client, account: email });
  if (!spent.ok) return spent;
  const { token, hash } = newToken();
  const known = db.select({ id: person.id }).from(person).where(eq(person.email, email)).get();
  if (asked.purpose === 'password' && !known) return sendMail(db, { to: email, ...nobodyMail(origin) });

  const expiresAt = now + MINUTES[asked.purpose] * 60_000;
  db.transaction((tx) => {
    // Nothing is asked of links that ran out a day ago.
    tx.delete(mailedToken)
      .where(lt(mailedToken.expiresAt, now - 86_400_000))
      .run();
    tx.insert(mailedToken)
      .values({ id: newId(), purpose: asked.purpose, email, tokenHash: hash, createdAt: now, expiresAt })
      .run();
  });
  const path = asked.purpose === 'sign-in' ? '/sign-in/mailed' : '/password/new';
  const link = `${origin}${path}?${new URLSearchParams({ token, then: asked.then })}`;
  const sent = await sendMail(db, { to: email, ...linkMail(asked.purpose, link, origin) });
  // A link that nobody received is not left lying about.
  if (!sent.ok)
    db.delete(mailedToken)
      .where(and(eq(mailedToken.tokenHash, hash), isNull(mailedToken.usedAt)))
      .run();
  return sent;
}
