import { createTransport, type Transporter } from 'nodemailer';

let open: { url: string; transport: Transporter } | null = null;

/** Milliseconds to wait for a mail server: a person is looking at the page that sends. */
const PATIENCE = 10_000;

/** The connection to the mail server, kept between messages. */
export function transportFor(url: string): Transporter {
  if (open?.url !== url) {
    open?.transport.close();
    open = {
      url,
      transport: createTransport({
        url,
        connectionTimeout: PATIENCE,
        greetingTimeout: PATIENCE,
        socketTimeout: PATIENCE,
        disableFileAccess: true,
        disableUrlAccess: true
      })
    };
  }
  return open.transport;
}
