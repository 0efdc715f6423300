import { createServer, type IncomingHttpHeaders } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A receiver of webhooks on this machine. */
export interface Listener {
  url: string;
  /** What came, in order. */
  heard: { headers: IncomingHttpHeaders; body: string }[];
  /** Status of the next answer; null breaks the connection. */
  answerWith: () => number | null;
  close(): void;
}

/** Listens on a free port. Its answers are 20 kB, more than anybody should read, and name a place to go on to. */
export async function listen(): Promise<Listener> {
  const server = createServer((request, response) => {
    let body = '';
    request.on('data', (chunk: Buffer) => (body += chunk.toString()));
    request.on('end', () => {
      listener.heard.push({ headers: request.headers, body });
      const status = listener.answerWith();
      if (status === null) response.destroy();
      else response.writeHead(status, { location: `${listener.url}elsewhere` }).end('x'.repeat(20_000));
    });
  });
  const listener: Listener = {
    url: '',
    heard: [],
    answerWith: () => 204,
    close() {
      server.closeAllConnections();
      server.close();
    }
  };
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  listener.url = `http://127.0.0.1:${(server.address() as AddressInfo).port}/`;
  return listener;
}
