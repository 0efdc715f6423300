import type { Handle } from '@sveltejs/kit';
import { authJs } from '../auth/auth-js';
import type { Person } from '../auth/person';
import { sessionCookie } from '../auth/session-cookie';

/** The addresses of Auth.js that are used; its other ones (a session as JSON, its own pages) do not exist here. */
const ITS_OWN = /^\/auth\/callback\/oidc$/;

/** Puts who is signed in into `locals.person`, asking Auth.js once a request, and lets it answer its own addresses. */
export const withPerson: Handle = ({ event, resolve }) => {
  event.locals.person = null;
  const { pathname } = event.url;
  if (/^\/auth(\/|$)/.test(pathname) && !(ITS_OWN.test(pathname) && event.request.method === 'GET'))
    return resolve(event);
  return authJs.handle({
    event,
    resolve: async (event) => {
      // Visitors without a session cost nothing.
      const { name } = sessionCookie(event.url.protocol === 'https:');
      if (event.cookies.get(name)) {
        const session = await event.locals.auth();
        event.locals.person = (session?.user as Person | undefined) ?? null;
      }
      return resolve(event);
    }
  });
};
