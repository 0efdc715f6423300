import { seenRequest } from '$lib/server/running/seen-request';
import type { IncomingMessage, ServerResponse } from 'node:http';

/** What browsers can send from a page of anybody's; Kit refuses these in plain words before any hook of ours. */
const FORMS = ['application/x-www-form-urlencoded', 'multipart/form-data', 'text/plain'];

const PROBLEM = {
  type: 'about:blank',
  status: 415,
  code: 'wrong-type',
  title: 'Name the type of what you send: Content-Type: text/csv or application/json.',
  detail: 'Forms are not taken here, and curl --data sends one unless it is given a type.'
};

/**
 * Refuses a form sent to the API in problem details, as all else is refused there: Kit's own guard against forged
 * requests would say "Cross-site POST form submissions are forbidden", which helps no script on.
 *
 * @returns whether it has answered
 */
export function refuseForm(request: IncomingMessage, response: ServerResponse): boolean {
  if (!request.url?.startsWith('/api/v1/') || request.method === 'GET' || request.method === 'HEAD')
    return false;
  const type = request.headers['content-type']?.split(';')[0].trim().toLowerCase() ?? '';
  if (!FORMS.includes(type)) return false;
  response.writeHead(415, { 'content-type': 'application/problem+json', 'cache-control': 'no-store' });
  response.end(JSON.stringify({ ...PROBLEM, requestId: seenRequest()?.id }));
  return true;
}
