/** How a link stands. */
export type LinkState = 'open' | 'revoked' | 'expired' | 'used-up';

export interface LinkTimes {
  revokedAt: number | null;
  expiresAt: number | null;
  visitLimit: number | null;
}

/** State of a link after `visits` counted visits; a link has expired at the very millisecond it says. */
export function linkState(link: LinkTimes, visits: number, now: number): LinkState {
  if (link.revokedAt !== null) return 'revoked';
  if (link.expiresAt !== null && link.expiresAt <= now) return 'expired';
  if (link.visitLimit !== null && visits >= link.visitLimit) return 'used-up';
  return 'open';
}
