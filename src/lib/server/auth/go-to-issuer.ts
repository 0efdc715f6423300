import type { RequestEvent } from '@sveltejs/kit';
import { authJs } from './auth-js';
import { posting } from './begin-session';

/** Sends the browser to the issuer; it comes back to /auth/callback/oidc and goes on to `then`. Throws the redirect. */
export async function goToIssuer(event: RequestEvent, then: string): Promise<never> {
  await authJs.signIn(posting(event, { providerId: 'oidc', redirectTo: then }));
  throw new Error('Auth.js ends this with a redirect.');
}
