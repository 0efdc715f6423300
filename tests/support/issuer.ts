import { OAuth2Server } from 'oauth2-mock-server';

export interface Claims {
  sub: string;
  name?: string;
  email?: string;
  email_verified?: boolean | string;
}

export interface TestIssuer {
  url: string;
  /** For the server under test. */
  env: Record<string, string>;
  /** Who comes to the issuer from now on. */
  visitor: Claims;
  /** What the last visit to its authorization endpoint asked for. */
  asked: URLSearchParams;
  /** Break the next answer: a nonce or an audience that is not ours. */
  spoil: 'nonce' | 'audience' | null;
  stop(): Promise<void>;
}

/** A real OpenID Connect issuer on loopback that lets everybody in as `visitor`. */
export async function startIssuer(): Promise<TestIssuer> {
  const server = new OAuth2Server();
  await server.issuer.keys.generate('RS256');
  await server.start(0, 'localhost');
  const url = server.issuer.url!;
  const issuer: TestIssuer = {
    url,
    env: {
      OIDC_ISSUER: url,
      OIDC_CLIENT_ID: 'severalty-test',
      OIDC_CLIENT_SECRET: 'a secret of the tests',
      OIDC_NAME: 'Invented Institute'
    },
    visitor: { sub: 'nobody' },
    asked: new URLSearchParams(),
    spoil: null,
    stop: () => server.stop()
  };
  server.service.on('beforeAuthorizeRedirect', (_redirect, request) => {
    issuer.asked = new URL(request.url ?? '', url).searchParams;
  });
  server.service.on('beforeTokenSigning', (token) => {
    token.payload.sub = issuer.visitor.sub;
    if (issuer.spoil === 'nonce') token.payload.nonce = 'another';
    if (issuer.spoil === 'audience') token.payload.aud = 'another';
  });
  server.service.on('beforeUserinfo', (response) => {
    response.body = { ...issuer.visitor };
  });
  return issuer;
}
