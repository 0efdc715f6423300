import type { Action } from '$lib/server/access/actions';
import type { Thing } from '$lib/server/access/can';
import { askTeam, type AskTeam } from '$lib/server/services/access/ask-team';
import type { RequestEvent } from '@sveltejs/kit';
import { problem } from './problem';

/** askTeam for JSON routes: the team and the actor, or problem details to answer with. */
export function askTeamJson(
  event: Pick<RequestEvent, 'locals'> & { params: Partial<Record<string, string>> },
  action: Action,
  thing?: Thing
): Extract<AskTeam, { ok: true }> | { ok: false; response: Response } {
  const asked = askTeam(
    event.locals.db,
    event.locals.person?.id ?? null,
    event.params.team ?? '',
    action,
    thing
  );
  if (asked.ok) return asked;
  const refusals = {
    'signed-out': { status: 401, code: 'signed-out', title: 'Sign in first.' },
    unknown: { status: 404, code: 'not-found', title: 'There is nothing at this address.' },
    'not-allowed': { status: 403, code: 'not-allowed', title: 'Your role in this team does not allow that.' }
  };
  return { ok: false, response: problem(refusals[asked.reason]) };
}
