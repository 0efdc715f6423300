/** Milliseconds that an invitation is good for: 14 days. */
export const INVITATION_LIFE = 14 * 24 * 60 * 60 * 1000;

/** Open invitations of one team at most, and milliseconds between two mails of one: nobody's mailbox is flooded. */
export const MOST_OPEN = 200;
export const BETWEEN_MAILS = 60_000;
