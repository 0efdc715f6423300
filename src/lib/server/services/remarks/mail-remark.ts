import { SECTION_NAMES, type RemarkSection } from '$lib/model/team/remarks/sections';
import type { Database } from '../../db/client';
import { sendMail, type Message, type SendMail } from '../../mail/send-mail';
import { readersOf, type Reader, type ToldRemark } from './readers-of';

/**
 * Tells the maker of the report and the thread's earlier authors of a new remark, each in a message of its own; never
 * its author. Those who remarked through a link get no more than the link shows: not which team, report or dataset
 * where it is blind, and no address, since the token of a link is kept nowhere.
 *
 * @param address the report's page for members
 * @returns how many messages could not be sent; the remark stands all the same
 */
export async function mailRemark(
  db: Database,
  remarkId: string,
  address: string,
  send: (db: Database, message: Message) => Promise<SendMail> = sendMail,
  now = Date.now()
): Promise<number> {
  const told = readersOf(db, remarkId, now);
  if (!told) return 0;
  // All at once: a mail server that does not answer costs its patience once, not once a reader.
  const sent = await Promise.all(
    told.readers.map((reader) => send(db, { to: reader.email, ...letter(told.remark, reader, address) }))
  );
  return sent.filter(({ ok }) => !ok).length;
}

function letter(remark: ToldRemark, reader: Reader, address: string): Omit<Message, 'to'> {
  const about = SECTION_NAMES[remark.section as RemarkSection] ?? remark.section;
  const said = remark.body.replace(/^/gm, '> ');
  if (reader.member) {
    const of = `report ${remark.number} of ${remark.dataset}`;
    return {
      subject: `New remark on ${of}`,
      text:
        (remark.fromTeam
          ? `${remark.signedAs} remarked on ${about}, in ${of}:`
          : `“${remark.signedAs}”, a reader of the link “${remark.label}”, remarked on ${about}, in ${of}:`) +
        `\n\n${said}\n\n${address}#remarks-${remark.section}\n` +
        (remark.fromTeam
          ? ''
          : '\nFurther remarks by this link within the hour are not mailed; the page has them.\n')
    };
  }
  const who = remark.fromTeam
    ? reader.blind
      ? 'The team'
      : `${remark.signedAs} of ${remark.team}`
    : `“${remark.signedAs}”, a reader of the link like you,`;
  return {
    subject: 'An answer to your remark',
    text:
      `${who} answered your remark on ${about} of a report:\n\n${said}\n\n` +
      'To read it in its place, open the link that you were given.\n'
  };
}
