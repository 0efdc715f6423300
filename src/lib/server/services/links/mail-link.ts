import { sayUntil } from '$lib/model/say-until';
import type { Database } from '../../db/client';
import { sendMail, type SendMail, type Message } from '../../mail/send-mail';

export interface LinkLetter {
  /** Whole address of the link, with its token. */
  address: string;
  people: string[];
  opens: 'report' | 'sweep';
  blind: boolean;
  allowsRemarks: boolean;
  expiresAt: number | null;
  visitLimit: number | null;
  /** Not told where the link is blind. */
  team: string;
  from: string;
}

/**
 * Sends a link to the people it names, each in a message of its own, so that referees do not learn of each other.
 *
 * @returns the addresses it could not be sent to; the link stands all the same, and its maker can pass it on
 */
export async function mailLink(
  db: Database,
  letter: LinkLetter,
  send: (db: Database, message: Message) => Promise<SendMail> = sendMail
): Promise<string[]> {
  const message = { subject: subjectOf(letter), text: textOf(letter) };
  const missed: string[] = [];
  for (const to of letter.people) {
    const sent = await send(db, { to, ...message });
    if (!sent.ok) missed.push(to);
  }
  return missed;
}

const THINGS = {
  report: { name: 'report', on: 'a report on counts of defects' },
  sweep: { name: 'sweep', on: 'a sweep: counts of defects over quench or hold time' }
};

const subjectOf = ({ opens, blind, team }: LinkLetter): string =>
  `A ${THINGS[opens].name} of ${blind ? 'counts' : team} for you to look at`;

const whatThere = ({ opens, allowsRemarks }: LinkLetter): string =>
  opens === 'sweep'
    ? 'There you can read the sweep, and take its document and its points as files.'
    : `There you can recompute the report in your own browser, check quantities claimed in a manuscript against it${allowsRemarks ? ', and remark on it' : ''}.`;

function textOf(letter: LinkLetter): string {
  const { opens, address, blind, team, from, expiresAt, visitLimit } = letter;
  const { on } = THINGS[opens];
  const lines = [
    blind
      ? `You are asked to look at ${on}. Whose it is stays hidden.`
      : `${from} of ${team} asks you to look at ${on}.`,
    '',
    address,
    '',
    'It opens for you alone: sign in with the address that this message came to. You need no account for that; a link to sign in is mailed to you.',
    whatThere(letter)
  ];
  if (expiresAt !== null) lines.push(`It is open ${sayUntil(expiresAt)}.`);
  if (visitLimit !== null)
    lines.push(`It may be opened ${visitLimit === 1 ? 'once' : `${visitLimit} times`} in all.`);
  lines.push('', 'If you expected no such message, leave it unanswered.');
  return `${lines.join('\n')}\n`;
}
