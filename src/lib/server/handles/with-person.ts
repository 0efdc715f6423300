import type { Handle } from '@sveltejs/kit';
import { authJs } from '../auth/auth-js';
import type { Person } from '../auth/person';
import { sessionCookie } from '../auth/session-cookie';

/** The one address of Auth.js that is used; its others (a session as JSON, pages of its own) do not exist here. */
const CALLBACK = /^\/auth\/callback\/oidc$/;

/** Puts who is signed in into `locals.person`, asking Auth.js once a request, and lets it answer the issuer's visitors. */
export const withPerson: Handle = async ({ event, resolve }) => {
  event.locals.person = null;
  const { pathname } = event.url;
  // Scripts come with a token alone: no cookie counts there, so no other site can make a browser act.
  if (pathname.startsWith('/api/v1/')) return resolve(event);
  if (/^\/auth(\/|$)/.test(pathname) && !(CALLBACK.test(pathname) && event.request.method === 'GET'))
    return resolve(event);
  const answer = await authJs.handle({
    event,
    resolve: async (event) => {
      // Visitors without a session cost nothing.
      const { name } = sessionCookie(event.url.protocol === 'https:');
      if (event.cookies.get(name)) {
        const session = await event.locals.auth();
        event.locals.person = (session?.user as Person | undefined) ?? null;
      }
      const response = await resolve(event);
      // What somebody signed in sees is not for caches, nor for the back button after they left.
      if (event.locals.person && !response.headers.has('cache-control'))
        response.headers.set('cache-control', 'private, no-store');
      return response;
    }
  });
  // Auth.js refuses with Response.redirect, whose headers nobody may add to; the security headers are yet to come.
  return CALLBACK.test(pathname) ? new Response(answer.body, answer) : answer;
};
