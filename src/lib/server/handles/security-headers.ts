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

/**
 * Of pages that a link opens, whose addresses are secrets: never told to anybody, kept by no cache, found by no search.
 * Posts from there go by `fetch`, whose Origin is not null under `no-referrer`; see src/routes/link.
 */
export const LINK_HEADERS = {
  'referrer-policy': 'no-referrer',
  'x-robots-tag': 'noindex, nofollow, noarchive',
  'cache-control': 'no-store'
} as const;

/** Adds the headers to what Kit answers. Files under /_app are served before Kit: the start command adds them there. */
export const securityHeaders: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  const headers = {
    ...SECURITY_HEADERS,
    ...(event.url.protocol === 'https:' ? STRICT_TRANSPORT : {}),
    ...(event.url.pathname.startsWith('/link/') ? LINK_HEADERS : {})
  };
  for (const [name, value] of Object.entries(headers)) response.headers.set(name, value);
  return response;
};
