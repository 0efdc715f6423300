import type { Handle } from '@sveltejs/kit';
import { seenRequest } from '../running/seen-request';

const TITLES: Record<number, { code: string; title: string }> = {
  404: { code: 'not-found', title: 'There is nothing at this address.' },
  405: { code: 'no-such-method', title: 'This address does not answer to that method.' },
  413: { code: 'too-large', title: 'That is more than this server takes at once.' },
  503: { code: 'busy', title: 'The database is busy. Nothing was changed; try again in a moment.' }
};

/**
 * What Kit itself refuses below /api/v1/ (an unknown address, a wrong method, an error) says so in problem details too
 * (RFC 9457): a script reads one shape of refusal. And nothing there is for caches.
 */
export const apiProblems: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  if (!event.url.pathname.startsWith('/api/v1/')) return response;
  const type = response.headers.get('content-type') ?? '';
  if (response.status < 400 || type.startsWith('application/problem+json')) {
    if (!response.headers.has('cache-control')) response.headers.set('cache-control', 'no-store');
    return response;
  }
  const { status } = response;
  const said = TITLES[status] ?? own();
  const headers = new Headers({ 'content-type': 'application/problem+json', 'cache-control': 'no-store' });
  for (const name of ['allow', 'retry-after']) {
    const value = response.headers.get(name);
    if (value) headers.set(name, value);
  }
  return new Response(JSON.stringify({ type: 'about:blank', status, ...said }), { status, headers });
};

/** The words of reportError; the id of the request finds the error in the log. */
function own(): { code: string; title: string; errorId?: string } {
  const found = seenRequest()?.id;
  const title = 'Something went wrong on our side.';
  return { code: 'internal', title, ...(found ? { errorId: found } : {}) };
}
