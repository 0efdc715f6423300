import { once, type KeptAnswer, type Outcome } from '$lib/server/services/idempotency/once';
import type { RequestEvent } from '@sveltejs/kit';
import { createHash } from 'node:crypto';
import { answering, bodyTrouble } from '../(team)/team/[team=slug]/datasets/answers';
import type { AskedToken } from '../ask-token';
import { problem, type Problem } from '../problem';

type Event = Pick<RequestEvent, 'request' | 'url' | 'locals'>;
type Asked = Extract<AskedToken, { ok: true }>;

/** Requests under a key that are still being read or answered by this process. */
const inFlight = new Set<string>();

/** The field is a quoted string (draft-ietf-httpapi-idempotency-key-header-07); bare words are understood too. */
const KEY = /^(?:"([\x21\x23-\x5b\x5d-\x7e]{1,200})"|([\w.:-]{1,200}))$/;

/**
 * Answers a POST of the API: reads its body, does the work, and under an Idempotency-Key does it once. `work` is given
 * the bytes and their type, and gives what to answer or why not; it runs within a transaction where there is a key.
 */
export async function posted(
  event: Event,
  asked: Asked,
  work: (body: Uint8Array, type: string) => Outcome<Problem>
): Promise<Response> {
  const header = event.request.headers.get('idempotency-key');
  const found = header === null ? null : KEY.exec(header.trim());
  if (header !== null && !found)
    return problem({
      status: 400,
      code: 'bad-key',
      title: 'An Idempotency-Key is 1 to 200 visible letters in quotation marks, such as a UUID.'
    });
  if (!found) return run(event, work);
  const key = found[1] ?? found[2];
  const tokenId = asked.actor.token.id;
  const mine = `${tokenId} ${key}`;
  if (inFlight.has(mine))
    return problem({
      status: 409,
      code: 'in-flight',
      title: 'The first request with this Idempotency-Key is still being answered. Ask again in a moment.'
    });
  inFlight.add(mine);
  try {
    return await run(event, work, { tokenId, key });
  } finally {
    inFlight.delete(mine);
  }
}

async function run(
  { request, url, locals }: Event,
  work: (body: Uint8Array, type: string) => Outcome<Problem>,
  under?: { tokenId: string; key: string }
): Promise<Response> {
  let body: Uint8Array;
  try {
    body = new Uint8Array(await request.arrayBuffer());
  } catch (error) {
    return problem(bodyTrouble(error));
  }
  const type = request.headers.get('content-type')?.split(';')[0].trim().toLowerCase() ?? '';
  return answering(() => {
    if (!under) {
      const outcome = work(body, type);
      return 'done' in outcome ? say(outcome.done) : problem(outcome.refused);
    }
    const about = `${request.method} ${url.pathname}${url.search}\n${type}\n`;
    const fingerprint = createHash('sha256').update(about).update(body).digest('hex');
    const result = once(locals.db, { ...under, fingerprint }, () => work(body, type));
    if (result.ok) return say(result.answer, result.again);
    if (result.reason === 'refused') return problem(result.refusal);
    return problem({
      status: 422,
      code: 'other-request',
      title: 'This Idempotency-Key came with another request before. A new request takes a new key.'
    });
  });
}

function say({ status, location, body }: KeptAnswer, again = false): Response {
  const headers = new Headers({ 'content-type': 'application/json', 'cache-control': 'no-store' });
  if (location) headers.set('location', location);
  if (again) headers.set('idempotency-replayed', 'true');
  return new Response(body, { status, headers });
}
