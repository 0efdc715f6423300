import type { Handle } from '@sveltejs/kit';
import { issuer } from '../auth/issuer';

/**
 * Lets the forms that lead to the issuer go there: browsers hold the redirect after a form's POST to `form-action` too,
 * and would stop it silently where there is no JavaScript.
 */
export const issuerFormAction: Handle = async ({ event, resolve }) => {
  const response = await resolve(event);
  const from = issuer();
  const policy = response.headers.get('content-security-policy');
  if (from && policy && /^\/(sign-in|account)(\/|$)/.test(event.url.pathname)) {
    const widened = policy.replace("form-action 'self'", `form-action 'self' ${new URL(from.url).origin}`);
    response.headers.set('content-security-policy', widened);
  }
  return response;
};
