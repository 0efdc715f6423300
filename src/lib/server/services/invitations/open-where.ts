import { and, gt, isNull, type SQL } from 'drizzle-orm';
import { invitation } from '../../db/schema';

/** Invitations that can be accepted now. */
export function openWhere(now: number): SQL | undefined {
  return and(isNull(invitation.acceptedAt), isNull(invitation.revokedAt), gt(invitation.expiresAt, now));
}
