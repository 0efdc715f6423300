import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Role } from '$lib/model/team/roles';
import type { Database } from '../../db/client';
import { invitation, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';

export interface OpenInvitation {
  id: string;
  email: string;
  role: Role;
  /** Name of who invited; null when that person is gone. */
  by: string | null;
  createdAt: number;
  expiresAt: number;
  expired: boolean;
}

/** Invitations that wait for an answer or ran out without one, newest first. For leads alone. */
export function invitations(db: Database, actor: Actor, now = Date.now()): OpenInvitation[] {
  return db
    .select({
      id: invitation.id,
      email: invitation.email,
      role: invitation.role,
      by: person.name,
      createdAt: invitation.createdAt,
      expiresAt: invitation.expiresAt,
      expired: sql<number>`${invitation.expiresAt} <= ${now}`.mapWith(Boolean)
    })
    .from(invitation)
    .leftJoin(person, eq(person.id, invitation.invitedBy))
    .where(
      and(
        mayWhere(actor, 'manage', invitation.teamId),
        isNull(invitation.acceptedAt),
        isNull(invitation.revokedAt)
      )
    )
    .orderBy(desc(invitation.createdAt), desc(invitation.id))
    .all();
}
