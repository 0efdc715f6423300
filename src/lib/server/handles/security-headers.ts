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

/** Adds the headers to what Kit answers. Files under /_app are served before Kit: the start command adds them there. */
export const securityHeaders: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  for (const [name, value] of Object.entries(SECURITY_HEADERS)) response.headers.set(name, value);
  return response;
};
