import { createHmac, hkdfSync, timingSafeEqual } from 'node:crypto';

/** Whose mail a link in it ends: of one team, or of all. */
export interface Unsubscribing {
  personId: string;
  teamId: string | null;
}

/**
 * The token of a link that ends mail: ids and an HMAC-SHA256 of them, under a key for nothing else (HKDF, RFC 5869).
 * It opens nothing and does not expire: old mail must be able to end new mail.
 */
export function unsubscribeToken({ personId, teamId }: Unsubscribing, serverSecret: string): string {
  const text = `${personId}.${teamId ?? ''}`;
  return `${text}.${sign(text, serverSecret).toString('base64url')}`;
}

/** Whose mail a token ends; null for what was not made here. */
export function readUnsubscribe(token: string, serverSecret: string): Unsubscribing | null {
  const found = /^([a-z0-9]{26})\.([a-z0-9]{26})?\.([\w-]{43})$/.exec(token);
  if (!found) return null;
  const [, personId, teamId = null, given] = found as unknown as [string, string, string | null, string];
  const wanted = sign(`${personId}.${teamId ?? ''}`, serverSecret);
  return timingSafeEqual(Buffer.from(given, 'base64url'), wanted) ? { personId, teamId } : null;
}

function sign(text: string, serverSecret: string): Buffer {
  const key = Buffer.from(hkdfSync('sha256', serverSecret, '', 'severalty: links that end mail', 32));
  return createHmac('sha256', key).update(text).digest();
}
