import { hash, verify } from '@node-rs/argon2';

/**
 * argon2id with 19 MiB, two passes, one lane: the first of the settings that the OWASP Password Storage Cheat Sheet
 * calls equal in strength. The package's default algorithm is argon2id (RFC 9106).
 */
const SETTINGS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** A password in argon2's own text form, salt and settings included. */
export function hashPassword(password: string): Promise<string> {
  return hash(normal(password), SETTINGS);
}

/** Hash of a password that nobody has: checking against it takes as long as checking against a real one. */
let nobody: Promise<string> | null = null;

/**
 * Whether a password fits. Without a hash (no such person, or one without a password) the same work is done and the
 * answer is no, so that the time taken does not tell which accounts exist.
 */
export async function passwordFits(kept: string | null | undefined, password: string): Promise<boolean> {
  const fits = await verify(
    kept ?? (await (nobody ??= hashPassword('nobody has this password'))),
    normal(password)
  );
  return fits && typeof kept === 'string';
}

/** One spelling of a letter with an accent, whichever keyboard typed it (NIST SP 800-63B, 5.1.1.2). */
const normal = (password: string) => password.normalize('NFKC');
