import { isRedirect, type RequestEvent } from '@sveltejs/kit';
import { authJs } from './auth-js';
import { issueTicket } from './tickets';

/** Signs somebody in whom the caller has checked: the answer to this request carries the session cookie. */
export async function beginSession(event: RequestEvent, personId: string): Promise<void> {
  const body = new URLSearchParams({ providerId: 'ticket', ticket: issueTicket(personId), redirectTo: '/' });
  const headers = new Headers(event.request.headers);
  headers.delete('content-length');
  headers.set('content-type', 'application/x-www-form-urlencoded');
  const request = new Request(event.url, { method: 'POST', headers, body });
  await authJs.signIn({ ...event, request }).catch(pass);
}

/** Ends the session of this browser. */
export async function endSession(event: RequestEvent): Promise<void> {
  const request = new Request(event.url, { method: 'POST', body: new URLSearchParams({ redirectTo: '/' }) });
  await authJs.signOut({ ...event, request }).catch(pass);
}

/** Auth.js ends both with a redirect; where to go is for the route to say. */
function pass(thrown: unknown): void {
  if (!isRedirect(thrown)) throw thrown;
}
