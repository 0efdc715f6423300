import { and, eq } from 'drizzle-orm';
import type { Role } from '$lib/model/team/roles';
import { hashToken } from '../../auth/new-token';
import type { Database } from '../../db/client';
import { invitation, membership, person, team } from '../../db/schema';

export interface InvitationRead {
  id: string;
  /** The address it was sent to. */
  email: string;
  role: Role;
  teamId: string;
  teamName: string;
  teamSlug: string;
  by: string | null;
  expiresAt: number;
}

export type ReadInvitation =
  | { ok: true; invitation: InvitationRead; fit: Fit }
  /** `used`: accepted before. `teamSlug` then, when by whoever asks, so that they find their team. */
  | { ok: false; reason: 'unknown' | 'revoked' | 'expired' | 'used'; teamSlug?: string };

/**
 * What stands between the person and the team: nothing (`ready`); nobody is signed in; the address is another one;
 * it is the right one but was never shown to be theirs; they are in the team already.
 */
export type Fit = 'ready' | 'signed-out' | 'other-address' | 'unverified' | 'member';

/** What the address of an invitation opens, for whoever is signed in. */
export function readInvitation(
  db: Pick<Database, 'select'>,
  token: string,
  personId: string | null,
  now = Date.now()
): ReadInvitation {
  const found = db
    .select({
      id: invitation.id,
      email: invitation.email,
      role: invitation.role,
      teamId: invitation.teamId,
      teamName: team.name,
      teamSlug: team.slug,
      by: person.name,
      expiresAt: invitation.expiresAt,
      acceptedAt: invitation.acceptedAt,
      revokedAt: invitation.revokedAt
    })
    .from(invitation)
    .innerJoin(team, eq(team.id, invitation.teamId))
    .leftJoin(person, eq(person.id, invitation.invitedBy))
    .where(eq(invitation.tokenHash, hashToken(token)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const { acceptedAt, revokedAt, ...read } = found;
  const who = personId === null ? undefined : whoIs(db, personId, read.teamId);
  if (acceptedAt !== null)
    return { ok: false, reason: 'used', teamSlug: who?.member ? read.teamSlug : undefined };
  if (revokedAt !== null) return { ok: false, reason: 'revoked' };
  if (read.expiresAt <= now) return { ok: false, reason: 'expired' };
  const fit: Fit = !who
    ? 'signed-out'
    : who.member
      ? 'member'
      : who.email !== read.email
        ? 'other-address'
        : who.verified
          ? 'ready'
          : 'unverified';
  return { ok: true, invitation: read, fit };
}

function whoIs(db: Pick<Database, 'select'>, personId: string, teamId: string) {
  const found = db
    .select({ email: person.email, verifiedAt: person.emailVerifiedAt, disabledAt: person.disabledAt })
    .from(person)
    .where(eq(person.id, personId))
    .get();
  if (!found || found.disabledAt !== null) return undefined;
  const member = db
    .select({ role: membership.role })
    .from(membership)
    .where(and(eq(membership.teamId, teamId), eq(membership.personId, personId)))
    .get();
  return { email: found.email, verified: found.verifiedAt !== null, member: member !== undefined };
}
