import { lookup, type LookupAddress } from 'node:dns';
import { request as plain } from 'node:http';
import { request as secure } from 'node:https';
import { isIP, type LookupFunction } from 'node:net';
import { isInnerAddress } from './is-inner-address';

/** Milliseconds for one attempt from its beginning to the end of the answer. */
const PATIENCE = 10_000;
/** Bytes of an answer that are read; its content matters to nobody. */
const MOST_READ = 4096;

export type Sent =
  /** Any status of 2xx. */
  { ok: true; answered: number } | { ok: false; answered: number | null; trouble: string };

const INNER = 'The address lies inside the network of this server, where webhooks are not sent.';

/**
 * Posts a message once. Redirects are not followed. The host is looked up here and the connection goes to the address
 * that was looked at, so that a name which changes between two lookups reaches nothing inside.
 */
export function sendMessage(
  url: string,
  headers: Record<string, string>,
  body: string,
  { allowInner, patience = PATIENCE }: { allowInner: boolean; patience?: number }
): Promise<Sent> {
  const address = new URL(url);
  const host = address.hostname.replace(/^\[|\]$/g, '');
  if (!allowInner && isIP(host) && isInnerAddress(host))
    return Promise.resolve({ ok: false, answered: null, trouble: INNER });
  return new Promise((resolve) => {
    const fail = (trouble: string, answered: number | null = null) => {
      resolve({ ok: false, answered, trouble });
    };
    const sent = (address.protocol === 'https:' ? secure : plain)(address, {
      method: 'POST',
      agent: false,
      lookup: allowInner ? undefined : outerLookup,
      signal: AbortSignal.timeout(patience),
      headers: {
        ...headers,
        'content-type': 'application/json',
        'content-length': Buffer.byteLength(body),
        'user-agent': 'Severalty webhook'
      }
    });
    sent.on('response', (answer) => {
      const status = answer.statusCode ?? 0;
      const done = () => {
        if (status >= 200 && status < 300) resolve({ ok: true, answered: status });
        else fail(status >= 300 && status < 400 ? 'Redirects are not followed.' : 'It refused.', status);
        sent.destroy();
      };
      let read = 0;
      answer.on('data', (chunk: Buffer) => {
        read += chunk.length;
        if (read > MOST_READ) done();
      });
      answer.on('end', done);
      answer.on('error', (error) => fail(sayTrouble(error, patience), status));
    });
    sent.on('error', (error) => fail(sayTrouble(error, patience)));
    sent.end(body);
  });
}

/** Looks a host up and gives addresses outside alone. */
const outerLookup: LookupFunction = (host, options, callback) => {
  lookup(host, { ...options, all: true }, (error, found: LookupAddress[]) => {
    if (error) return callback(error, '', 0);
    const outer = found.filter(({ address }) => !isInnerAddress(address));
    if (outer.length === 0) return callback(Object.assign(new Error(INNER), { code: 'INNER' }), '', 0);
    if (options.all) callback(null, outer);
    else callback(null, outer[0].address, outer[0].family);
  });
};

function sayTrouble(error: NodeJS.ErrnoException, patience: number): string {
  if (error.name === 'AbortError' || error.name === 'TimeoutError')
    return `It did not answer within ${patience / 1000} s.`;
  switch (error.code) {
    case 'INNER':
      return INNER;
    case 'ENOTFOUND':
    case 'EAI_AGAIN':
      return 'Its host was not found.';
    case 'ECONNREFUSED':
      return 'Nobody listens there.';
    default:
      return `The connection failed${error.code ? ` (${error.code})` : ''}.`;
  }
}
