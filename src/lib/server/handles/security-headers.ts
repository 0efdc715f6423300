import type { Handle } from '@sveltejs/kit';

/**
 * Headers of every answer; the content security policy is Kit's (svelte.config.js).
 *
 * `same-origin`, not `no-referrer`: with the latter browsers send `Origin: null` on a form's POST, which
 * Kit's guard against forged requests refuses. Both keep addresses, which can carry counts, from others.
 */
export const SECURITY_HEADERS = {
  'x-content-type-options': 'nosniff',
  'referrer-policy': 'same-origin',
  'permissions-policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=()',
  'cross-origin-opener-policy': 'same-origin'
} as const;

/**
 * Told only over https, where browsers heed it: one year of never asking this host over plain http (RFC 6797). Without
 * includeSubDomains, as the other hosts of the domain are not ours to speak for.
 */
export const STRICT_TRANSPORT = { 'strict-transport-security': 'max-age=31536000' } as const;

/** Adds the headers to what Kit answers. Files under /_app are served before Kit: the start command adds them there. */
export const securityHeaders: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  const headers =
    event.url.protocol === 'https:' ? { ...SECURITY_HEADERS, ...STRICT_TRANSPORT } : SECURITY_HEADERS;
  for (const [name, value] of Object.entries(headers)) response.headers.set(name, value);
  return response;
};
