import type { Action } from '$lib/server/access/actions';
import type { Thing } from '$lib/server/access/can';
import type { Person } from '$lib/server/auth/person';
import { askTeam as ask, type AskTeam } from '$lib/server/services/access/ask-team';
import { error, redirect, type RequestEvent } from '@sveltejs/kit';

type Allowed = Extract<AskTeam, { ok: true }>;

/**
 * For a page of a team: the team and the actor, or the right refusal. Somebody signed out is sent to sign in and comes
 * back; a stranger is told that there is no such page, as is anybody who asks for a team that does not exist.
 */
export function askTeam(
  event: Pick<RequestEvent, 'locals' | 'url'> & { params: Partial<Record<string, string>> },
  action: Action,
  thing?: Thing
): Allowed {
  const asked = ask(event.locals.db, event.locals.person?.id ?? null, event.params.team ?? '', action, thing);
  if (asked.ok) return asked;
  if (asked.reason === 'signed-out') toSignIn(event);
  if (asked.reason === 'unknown')
    error(404, { message: 'There is no page at this address.', code: 'not-found' });
  error(403, { message: 'Your role in this team does not allow that.', code: 'not-allowed' });
}

/** For a page that is one's own, in no team: who is signed in. Somebody signed out is sent to sign in and comes back. */
export function askPerson(event: Pick<RequestEvent, 'locals' | 'url'>): Person {
  return event.locals.person ?? toSignIn(event);
}

function toSignIn({ url }: Pick<RequestEvent, 'url'>): never {
  // `?/save` names a form's action: coming back to it would be no page.
  const search = url.search.startsWith('?/') ? '' : url.search;
  redirect(303, `/sign-in?then=${encodeURIComponent(url.pathname + search)}`);
}

/** Said by a route that is open to everybody, so that the test which walks the routes knows it was meant. */
export function openToAll(): void {}
