import { randomBytes } from 'node:crypto';

/** Lower case letters and digits without l, o, 0 and 1, which people mix up. */
const letters = 'abcdefghijkmnpqrstuvwxyz23456789';

/** A random id of 26 letters: 130 bits, so that ids cannot be guessed. */
export function newId(): string {
  return Array.from(randomBytes(26), (byte) => letters[byte & 31]).join('');
}
