import { createHmac } from 'node:crypto';

/** How a secret begins; base64 of its bytes follows. */
export const SECRET_PREFIX = 'whsec_';

/**
 * Header fields of a signed message, after the open specification Standard Webhooks 1.0: HMAC-SHA256 over
 * `id.seconds.body`. The moment is in it, so that a receiver can refuse what is old; the id, so that it can refuse
 * what it had before.
 *
 * @param id the same at every attempt
 * @param at milliseconds since 1970; sent as whole seconds
 */
export function signMessage(secret: string, id: string, at: number, body: string): Record<string, string> {
  const seconds = String(Math.floor(at / 1000));
  const key = Buffer.from(secret.slice(SECRET_PREFIX.length), 'base64');
  const signature = createHmac('sha256', key).update(`${id}.${seconds}.${body}`).digest('base64');
  return { 'webhook-id': id, 'webhook-timestamp': seconds, 'webhook-signature': `v1,${signature}` };
}
