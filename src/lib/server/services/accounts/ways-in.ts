import { issuer } from '../../auth/issuer';
import { isLocal, readEnv, type Env } from '../../env';

/** Which ways to sign in this installation offers beside the password. */
export function waysIn(env: Env = readEnv()): { mail: boolean; issuer: string | null } {
  return { mail: Boolean(env.SMTP_URL) || isLocal(env), issuer: issuer(env)?.name ?? null };
}
