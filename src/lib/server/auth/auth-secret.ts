import { randomBytes } from 'node:crypto';
import { chmodSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { readEnv, type Env } from '../env';

let known: { folder: string; secret: string } | null = null;

/**
 * The key that session cookies are sealed with: AUTH_SECRET, or one made at the first start and kept in the data
 * folder, readable by its owner alone. Who has it can be anybody.
 */
export function authSecret(env: Pick<Env, 'AUTH_SECRET' | 'SEVERALTY_DATA'> = readEnv()): string {
  if (env.AUTH_SECRET) return env.AUTH_SECRET;
  if (known?.folder !== env.SEVERALTY_DATA) {
    known = { folder: env.SEVERALTY_DATA, secret: keptSecret(env.SEVERALTY_DATA) };
  }
  return known.secret;
}

function keptSecret(folder: string): string {
  const file = join(folder, 'auth-secret');
  mkdirSync(folder, { recursive: true });
  try {
    // wx: of two processes that start at once, one writes and the other reads what it wrote.
    writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600, flag: 'wx' });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
    // A copy or a restored backup may have wider rights.
    chmodSync(file, 0o600);
  }
  const secret = readFileSync(file, 'utf8');
  if (secret.length < 32)
    throw new Error(`${file} is damaged: remove it, and everybody signs in again at the next start.`);
  return secret;
}
