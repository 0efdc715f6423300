import type { Action } from '$lib/server/access/actions';
import type { Thing } from '$lib/server/access/can';
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
  if (asked.reason === 'signed-out')
    redirect(303, `/sign-in?then=${encodeURIComponent(event.url.pathname + event.url.search)}`);
  if (asked.reason === 'unknown')
    error(404, { message: 'There is no page at this address.', code: 'not-found' });
  error(403, { message: 'Your role in this team does not allow that.', code: 'not-allowed' });
}

/** Said by a route that is open to everybody, so that the test which walks the routes knows it was meant. */
export function openToAll(): void {}
