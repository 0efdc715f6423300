import { createHash, randomBytes } from 'node:crypto';

/** A secret for an address or a mail, and what the database keeps of it. */
export interface Token {
  /** 43 characters that an address takes as they are: 256 bits. */
  token: string;
  hash: string;
}

export function newToken(): Token {
  const token = randomBytes(32).toString('base64url');
  return { token, hash: hashToken(token) };
}

/** sha256 of a token; plain, since 256 random bits cannot be searched. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
