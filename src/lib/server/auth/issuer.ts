import type { OIDCConfig } from '@auth/core/providers';
import { readEnv, type Env } from '../env';

export interface Issuer {
  /** The issuer's own name, as it stands in its tokens. */
  url: string;
  /** What people call it. */
  name: string;
  clientId: string;
  clientSecret: string;
}

/** The OpenID Connect issuer of this installation, or null when none is set up. */
export function issuer(env: Env = readEnv()): Issuer | null {
  const { OIDC_ISSUER, OIDC_CLIENT_ID, OIDC_CLIENT_SECRET, OIDC_NAME } = env;
  if (!OIDC_ISSUER || !OIDC_CLIENT_ID || !OIDC_CLIENT_SECRET) return null;
  return { url: OIDC_ISSUER, name: OIDC_NAME, clientId: OIDC_CLIENT_ID, clientSecret: OIDC_CLIENT_SECRET };
}

/** What the issuer may say of somebody (OpenID Connect Core 1.0, 5.1). */
export interface Claims {
  sub: string;
  name?: string;
  email?: string;
  /** Some issuers send it as text. */
  email_verified?: boolean | string;
}

/** The issuer as Auth.js takes it. */
export function issuerProvider({ url, name, clientId, clientSecret }: Issuer): OIDCConfig<Claims> {
  return {
    id: 'oidc',
    type: 'oidc',
    name,
    issuer: url,
    clientId,
    clientSecret,
    checks: ['pkce', 'state', 'nonce'],
    authorization: { params: { scope: 'openid email profile' } },
    // The address comes from the userinfo endpoint: with the code flow the ID token need not hold it (5.4). Auth.js
    // compares both `sub`s.
    idToken: false,
    profile: ({ sub, name, email }) => ({ id: sub, name, email })
  };
}
