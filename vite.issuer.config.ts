import type { Plugin } from 'vite';

/**
 * `npm run dev` brings an institution along: an OpenID Connect issuer on loopback that lets everybody in as one invented
 * person. Not where OIDC_ISSUER names a real one, and never in a build.
 */
export function devIssuer(): Plugin {
  return {
    name: 'severalty-dev-issuer',
    apply: 'serve',
    async configureServer() {
      // Once a process: Vite restarts its server when a setting changes, the new one before the old one ends.
      if (process.env.VITEST || process.env.OIDC_ISSUER) return;
      const { OAuth2Server } = await import('oauth2-mock-server');
      const issuer = new OAuth2Server();
      await issuer.issuer.keys.generate('RS256');
      await issuer.start(0, 'localhost');
      issuer.service.on('beforeTokenSigning', (token) => {
        token.payload.sub = 'invented-visitor';
      });
      issuer.service.on('beforeUserinfo', (response) => {
        response.body = {
          sub: 'invented-visitor',
          name: 'Ida Invented',
          email: 'ida@example.org',
          email_verified: true
        };
      });
      Object.assign(process.env, {
        OIDC_ISSUER: issuer.issuer.url,
        OIDC_CLIENT_ID: 'severalty-dev',
        OIDC_CLIENT_SECRET: 'not a secret',
        OIDC_NAME: 'Invented Institute'
      });
    }
  };
}
