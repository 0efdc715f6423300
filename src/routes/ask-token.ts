import { ACTION_OF_SCOPE, type Scope } from '$lib/model/api/scopes';
import { can } from '$lib/server/access/can';
import { clientOf } from '$lib/server/auth/client-of';
import { limitHeaders, spendRequest } from '$lib/server/auth/request-limits';
import type { Actor } from '$lib/server/services/access/actor';
import type { TeamEntry } from '$lib/server/services/access/ask-team';
import { openToken } from '$lib/server/services/tokens/open-token';
import type { RequestEvent } from '@sveltejs/kit';
import { problem, type Problem } from './problem';

type Event = Pick<RequestEvent, 'locals' | 'request' | 'getClientAddress' | 'setHeaders'>;

export type AskedToken =
  | { ok: true; team: TeamEntry; actor: Required<Actor>; scopes: Scope[]; expiresAt: number }
  | { ok: false; response: Response };

const REALM = 'Bearer realm="severalty"';

/**
 * For an operation of the API: whose token came, or problem details to answer with. Only the header counts (RFC 6750),
 * never a cookie. A token that is malformed, unknown, expired, revoked or of somebody who left is refused in one and
 * the same way; a scope or role that does not reach is told, since it is the script's own. Asked before any id is looked
 * up, so an id of another team is 404 for everybody.
 *
 * @param cost as how many requests it counts
 */
export async function askToken(event: Event, scope: Scope, cost = 1): Promise<AskedToken> {
  const header = event.request.headers.get('authorization');
  const text = /^Bearer +(\S+)$/i.exec(header ?? '')?.[1];
  const opened = text ? openToken(event.locals.db, text) : ({ ok: false } as const);
  const limit = opened.ok ? 'token' : 'unknown';
  const spent = await spendRequest(limit, opened.ok ? opened.actor.token.id : clientOf(event), cost);
  const fields = limitHeaders(limit, spent);
  const refuse = (why: Problem, more: Record<string, string> = {}): AskedToken => {
    const response = problem(why);
    for (const [name, value] of Object.entries({ ...fields, ...more })) response.headers.set(name, value);
    return { ok: false, response };
  };
  if (!spent.ok)
    return refuse({
      status: 429,
      code: 'too-many-requests',
      title: `Too many requests. Wait ${spent.seconds} s and go on.`
    });
  if (!opened.ok)
    return refuse(
      {
        status: 401,
        code: 'no-token',
        title: 'Send a valid token of your team, as “Authorization: Bearer sev_…”.'
      },
      // RFC 6750, 3.1: no error code where no token came.
      { 'www-authenticate': header === null ? REALM : `${REALM}, error="invalid_token"` }
    );
  if (!opened.scopes.includes(scope))
    return refuse(
      {
        status: 403,
        code: 'wrong-scope',
        title: `This token was not made for that: it lacks the scope “${scope}”.`
      },
      { 'www-authenticate': `${REALM}, error="insufficient_scope", scope="${scope}"` }
    );
  const { personId, role } = opened.actor;
  if (!can({ kind: 'member', personId, role }, ACTION_OF_SCOPE[scope]))
    return refuse({
      status: 403,
      code: 'not-allowed',
      title: `The role this token has now, ${role}, does not allow that.`
    });
  event.setHeaders(fields);
  return opened;
}
