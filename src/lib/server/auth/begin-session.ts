import { isRedirect, type RequestEvent } from '@sveltejs/kit';
import { authJs } from './auth-js';
import { issueTicket } from './tickets';

/** Signs somebody in whom the caller has checked: the answer to this request carries the session cookie. */
export async function beginSession(event: RequestEvent, personId: string): Promise<void> {
  const form = { providerId: 'ticket', ticket: issueTicket(personId), redirectTo: '/' };
  await withoutRedirect(() => authJs.signIn(posting(event, form)));
}

/** Ends the session of this browser. */
export async function endSession(event: RequestEvent): Promise<void> {
  await withoutRedirect(() => authJs.signOut(posting(event, { redirectTo: '/' })));
}

/** The event as if its form had held other fields: Auth.js reads what it needs from a form. */
export function posting(event: RequestEvent, form: Record<string, string>): RequestEvent {
  const headers = new Headers(event.request.headers);
  headers.delete('content-length');
  headers.set('content-type', 'application/x-www-form-urlencoded');
  const request = new Request(event.url, { method: 'POST', headers, body: new URLSearchParams(form) });
  return { ...event, request };
}

/** Auth.js ends with a redirect; where to go is for the route to say. */
async function withoutRedirect(act: () => unknown): Promise<void> {
  try {
    await act();
  } catch (thrown) {
    if (!isRedirect(thrown)) throw thrown;
  }
}
