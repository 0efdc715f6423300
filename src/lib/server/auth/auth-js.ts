import { SvelteKitAuth, type SvelteKitAuthConfig } from '@auth/sveltekit';
import Credentials from '@auth/sveltekit/providers/credentials';
import type { RequestEvent } from '@sveltejs/kit';
import { log } from '../log';
import { authSecret } from './auth-secret';
import { identify } from './identify';
import { issuer, issuerProvider, type Claims } from './issuer';
import type { Person } from './person';
import { sessionCookie } from './session-cookie';
import { sessionPerson, sessionVersion } from './session-person';
import { takeTicket } from './tickets';

/** Seconds a session lives after the last visit. */
const SESSION = 14 * 24 * 3600;

/**
 * Auth.js keeps the session: a sealed cookie that holds who and which version, nothing else. Whether it still counts is
 * looked up at every request.
 */
export const authJs = SvelteKitAuth((event) => Promise.resolve(configFor(event)));

function configFor(event: RequestEvent): SvelteKitAuthConfig {
  const { db } = event.locals;
  const from = issuer();
  return {
    secret: authSecret(),
    trustHost: true,
    session: { strategy: 'jwt', maxAge: SESSION },
    pages: { signIn: '/sign-in', signOut: '/account', error: '/sign-in' },
    cookies: { sessionToken: sessionCookie(event.url.protocol === 'https:') },
    providers: [
      Credentials({
        id: 'ticket',
        credentials: { ticket: {} },
        authorize: ({ ticket }) => {
          const id = takeTicket(String(ticket));
          return id === null ? null : { id };
        }
      }),
      ...(from ? [issuerProvider(from)] : [])
    ],
    callbacks: {
      async signIn({ user, account, profile }) {
        if (account?.type !== 'oidc' || !from) return account?.provider === 'ticket';
        const claims = profile as Claims | undefined;
        const signedIn = ((await event.locals.auth())?.user as Person | undefined)?.id ?? null;
        const who = identify(
          db,
          {
            issuer: from.url,
            subject: account.providerAccountId,
            email: claims?.email ?? null,
            emailVerified: String(claims?.email_verified) === 'true',
            name: claims?.name ?? null
          },
          signedIn
        );
        if (!who.ok) return `${signedIn === null ? '/sign-in' : '/account'}?problem=${who.reason}`;
        user.id = who.personId;
        return true;
      },
      jwt({ token, user }) {
        if (user) {
          const version = sessionVersion(db, user.id ?? '');
          return version === null ? null : { sub: user.id, version };
        }
        return sessionPerson(db, token.sub ?? '', Number(token.version)) ? token : null;
      },
      session({ session, token }) {
        const person = sessionPerson(db, token.sub ?? '', Number(token.version));
        return { ...session, user: { ...person } };
      }
    },
    logger: {
      // A cookie of another key is everyday: the data folder was changed, or another server ran on this port. Causes
      // may hold what was posted, so only the name goes into the log.
      error: (error) => {
        if (error.name !== 'JWTSessionError' && error.name !== 'CredentialsSignin')
          log('error', `Sign-in failed: ${error.name}`);
      },
      warn: () => {},
      debug: () => {}
    }
  };
}
