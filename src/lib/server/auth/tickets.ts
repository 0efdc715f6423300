import { newToken } from './new-token';

/** A ticket is taken within the request that wrote it. */
const SECONDS = 30;

const open = new Map<string, { personId: string; until: number }>();

/**
 * A word that lets Auth.js begin a session for somebody whom we have checked: by password or by mailed link, with its
 * limits. Auth.js has an address of its own for credentials; were passwords checked there, posting to it would pass by
 * the limits.
 */
export function issueTicket(personId: string, now = Date.now()): string {
  for (const [ticket, { until }] of open) if (until < now) open.delete(ticket);
  const { token } = newToken();
  open.set(token, { personId, until: now + SECONDS * 1000 });
  return token;
}

/** Whom the ticket is for; good once. */
export function takeTicket(ticket: string, now = Date.now()): string | null {
  const found = open.get(ticket);
  open.delete(ticket);
  return found && found.until >= now ? found.personId : null;
}
