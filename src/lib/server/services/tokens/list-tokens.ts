import type { Scope } from '$lib/model/api/scopes';
import type { TeamToken } from '$lib/model/api/team-token';
import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { apiToken, membership, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

/** Tokens of the team, the newest first: all for a lead, their own for the others. */
export function listTokens(db: Database, actor: Actor, now = Date.now()): TeamToken[] {
  const rows = db
    .select({
      id: apiToken.id,
      name: apiToken.name,
      hint: apiToken.hint,
      role: apiToken.role,
      scopes: apiToken.scopes,
      by: person.name,
      createdAt: apiToken.createdAt,
      expiresAt: apiToken.expiresAt,
      lastUsedOn: apiToken.lastUsedOn,
      revokedAt: apiToken.revokedAt,
      disabledAt: person.disabledAt,
      joinedAt: membership.createdAt
    })
    .from(apiToken)
    .innerJoin(person, eq(person.id, apiToken.createdBy))
    .leftJoin(
      membership,
      and(eq(membership.teamId, apiToken.teamId), eq(membership.personId, apiToken.createdBy))
    )
    .where(mayWhere(actor, 'script', apiToken.teamId, apiToken.createdBy))
    .orderBy(desc(apiToken.createdAt), desc(apiToken.id))
    .all();
  return rows.map(({ revokedAt, disabledAt, joinedAt, scopes, ...row }) => {
    const gone = disabledAt !== null || joinedAt === null || joinedAt > row.createdAt;
    const state = revokedAt !== null ? 'revoked' : gone ? 'ended' : row.expiresAt <= now ? 'expired' : 'open';
    return { ...row, scopes: JSON.parse(scopes) as Scope[], state };
  });
}
