import type { Handle } from '@sveltejs/kit';
import { requestId } from '../running/request-id';
import { inRequest, seenRequest, type SeenRequest } from '../running/seen-request';

/**
 * Gives each request its id: in X-Request-Id and in problem details, where somebody can quote it, and in every line of
 * the log that is written on the way (`log`). The start command has begun the request already; `npm run dev` has not.
 */
export const seeRequest: Handle = ({ event, resolve }) => {
  const seen = seenRequest() ?? { id: requestId(undefined, false) };
  return inRequest(seen, () => answer(seen, { event, resolve }));
};

async function answer(seen: SeenRequest, { event, resolve }: Parameters<Handle>[0]): Promise<Response> {
  seen.route = event.route.id;
  const response = await resolve(event);
  if (event.locals.person) seen.person ??= event.locals.person.id;
  const named = await inProblem(response, seen.id);
  named.headers.set('x-request-id', seen.id);
  return named;
}

async function inProblem(response: Response, requestId: string): Promise<Response> {
  if (!response.headers.get('content-type')?.startsWith('application/problem+json')) return response;
  const text = await response.text();
  // Nothing to add to: the answer to a HEAD.
  const body = text === '' ? null : JSON.stringify({ ...(JSON.parse(text) as object), requestId });
  const headers = new Headers(response.headers);
  headers.delete('content-length');
  return new Response(body, { status: response.status, headers });
}
