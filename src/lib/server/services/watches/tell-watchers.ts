import type { Database } from '../../db/client';
import { sendMail, type Message, type SendMail } from '../../mail/send-mail';
import { claimNews, giveBackNews, peopleToTell } from './claim-news';
import { newsLetter } from './news-letter';

export interface TellingSettings {
  /** Address of the application, for links. */
  origin: string;
  serverSecret: string;
  /** Hour of the daily mail, UTC. */
  hour: number;
}

/** Milliseconds until mail that could not be sent is tried again. */
const LATER = 5 * 60_000;

/**
 * Mails to everybody what is new of what they watch. What is told is noted before it is mailed, and given back where
 * the mail server did not take it: nothing is told twice, and only a process that ends between note and mail loses one.
 *
 * @param waiting people whose mail failed, and until when they wait; kept by the caller
 * @returns how many mails went out
 */
export async function tellWatchers(
  db: Database,
  { origin, serverSecret, hour }: TellingSettings,
  waiting: Map<string, number>,
  send: (db: Database, message: Message) => Promise<SendMail> = sendMail,
  now = Date.now()
): Promise<number> {
  let sent = 0;
  for (const personId of peopleToTell(db, hour, now)) {
    const until = waiting.get(personId);
    if (until !== undefined && until > now && until <= now + LATER) continue;
    waiting.delete(personId);
    const news = claimNews(db, personId, hour, now);
    if (!news) continue;
    const result = await send(db, newsLetter(db, news, { origin, serverSecret }));
    if (result.ok) sent += 1;
    // Where no mail server is set up, waiting for one would pile up years.
    else if (result.reason === 'not-sent') {
      giveBackNews(db, news);
      waiting.set(personId, now + LATER);
    }
  }
  return sent;
}
