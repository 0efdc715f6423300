import { log } from '$lib/server/log';
import { requestId } from '$lib/server/running/request-id';
import { inRequest, type SeenRequest } from '$lib/server/running/seen-request';
import { shownPath } from '$lib/server/running/shown-path';
import type { RequestListener, ServerResponse } from 'node:http';

/** Asked every few seconds by machines, and what a page is built from: told at `debug` alone. */
const QUIET = /^\/(healthz|readyz|metrics|_app\/.*)$/;

/**
 * Around everything that answers: gives each request its id, and writes one line about it when it ends. What routes find
 * out (template, person, team) comes from `noteRequest`.
 *
 * @param behindProxy whether X-Request-Id comes from a proxy of ours
 */
export function seeRequests(answer: RequestListener, behindProxy: boolean): RequestListener {
  return (request, response) => {
    const seen: SeenRequest = { id: requestId(request.headers['x-request-id'], behindProxy) };
    const begun = performance.now();
    const { method = '', url = '' } = request;
    response.setHeader('x-request-id', seen.id);
    response.once('close', () => tell(seen, method, shownPath(url), response, performance.now() - begun));
    inRequest(seen, () => answer(request, response));
  };
}

function tell(
  seen: SeenRequest,
  method: string,
  path: string,
  { statusCode: status, writableFinished }: ServerResponse,
  took: number
): void {
  const { id: request, route, person, team, token } = seen;
  const level = status >= 500 ? 'warn' : QUIET.test(path) ? 'debug' : 'info';
  log(level, 'request', {
    request,
    method,
    path,
    route,
    status,
    ms: Math.round(took),
    person,
    team,
    token,
    // The reader went away, or the server cut it at its end.
    ...(writableFinished ? {} : { cut: true })
  });
}
