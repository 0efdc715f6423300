import { simpleParser, type ParsedMail } from 'mailparser';
import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';

export interface MailServer {
  /** For SMTP_URL. */
  url: string;
  /** Everything received so far, as a reader's program would take it apart. */
  messages: ParsedMail[];
  /** The recipients that the envelopes named, one list a message. */
  recipients: string[][];
  /** The newest message to an address, waited for. */
  to(address: string): Promise<ParsedMail>;
  stop(): Promise<void>;
}

/**
 * A real SMTP server on loopback.
 *
 * @param refuse answers every recipient with 550
 */
export async function startMailServer({ refuse = false } = {}): Promise<MailServer> {
  const messages: ParsedMail[] = [];
  const recipients: string[][] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onRcptTo: (_address, _session, done) =>
      done(refuse ? Object.assign(new Error('No such mailbox'), { responseCode: 550 }) : null),
    onData(stream, session, done) {
      recipients.push(session.envelope.rcptTo.map(({ address }) => address));
      void simpleParser(stream).then((mail) => {
        messages.push(mail);
        done();
      }, done);
    }
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    messages,
    recipients,
    async to(address) {
      const until = Date.now() + 10_000;
      for (;;) {
        const index = recipients.findLastIndex((list) => list.includes(address));
        if (index >= 0 && messages[index]) return messages[index];
        if (Date.now() > until) throw new Error(`No message to ${address}.`);
        await new Promise((resolve) => setTimeout(resolve, 20));
      }
    },
    stop: () => new Promise((resolve) => server.close(() => resolve()))
  };
}

/** The first address in a message that begins so. */
export function linkIn(mail: Pick<ParsedMail, 'text'>, start: string): string {
  const found = (mail.text ?? '').split(/\s+/).find((word) => word.startsWith(start));
  if (!found) throw new Error(`No address ${start}… in:\n${mail.text}`);
  return found;
}
