import type { Scope } from '$lib/model/api/scopes';
import { narrowerRole } from '$lib/model/team/narrower-role';
import { and, eq, gt, gte, isNull, ne, or } from 'drizzle-orm';
import { hashToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { apiToken, membership, person, team } from '../../db/schema';
import { noteRequest } from '../../running/seen-request';
import type { Actor } from '../access/actor';
import type { TeamEntry } from '../access/ask-team';
import { dayOf } from '../links/day-of';

export type OpenedToken =
  | { ok: true; team: TeamEntry; actor: Required<Actor>; scopes: Scope[]; expiresAt: number }
  /** Malformed, unknown, expired, revoked, or its maker is gone: which of them is not told. */
  | { ok: false };

const SHAPE = /^sev_[a-z0-9]{8}_[A-Za-z0-9_-]{43}$/;

/**
 * What a token opens at this moment. It acts for who made it, with the narrower of its role and theirs, and for as long
 * as they are in the team without a break: who left and came back makes new ones.
 */
export function openToken(db: Database, text: string, now = Date.now()): OpenedToken {
  if (!SHAPE.test(text)) return { ok: false };
  const found = db
    .select({
      id: apiToken.id,
      name: apiToken.name,
      role: apiToken.role,
      scopes: apiToken.scopes,
      expiresAt: apiToken.expiresAt,
      personId: apiToken.createdBy,
      personRole: membership.role,
      team: { id: team.id, slug: team.slug, name: team.name }
    })
    .from(apiToken)
    .innerJoin(team, eq(team.id, apiToken.teamId))
    .innerJoin(person, eq(person.id, apiToken.createdBy))
    .innerJoin(
      membership,
      and(eq(membership.teamId, apiToken.teamId), eq(membership.personId, apiToken.createdBy))
    )
    .where(
      and(
        eq(apiToken.tokenHash, hashToken(text)),
        isNull(apiToken.revokedAt),
        gt(apiToken.expiresAt, now),
        isNull(person.disabledAt),
        gte(apiToken.createdAt, membership.createdAt)
      )
    )
    .get();
  if (!found) return { ok: false };
  noteUse(db, found.id, now);
  const { id, name, role, personId, personRole } = found;
  noteRequest({ person: personId, team: found.team.id, token: id });
  return {
    ok: true,
    team: found.team,
    actor: {
      personId,
      teamId: found.team.id,
      role: narrowerRole(role, personRole),
      token: { id, name, role }
    },
    scopes: JSON.parse(found.scopes) as Scope[],
    expiresAt: found.expiresAt
  };
}

/** One write a day, however often it is used. */
function noteUse(db: Database, id: string, now: number): void {
  const today = dayOf(now);
  db.update(apiToken)
    .set({ lastUsedOn: today })
    .where(and(eq(apiToken.id, id), or(isNull(apiToken.lastUsedOn), ne(apiToken.lastUsedOn, today))))
    .run();
}
