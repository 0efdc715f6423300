const FIRST = 10_000;
const LONGEST = 6 * 3_600_000;

/** Attempts after which a message is given up: by retryDelay, about three days after the first. */
export const MOST_ATTEMPTS = 19;

/**
 * Milliseconds to wait after an attempt that failed: 10 s, three times as long after each, at most 6 h; a fifth more or
 * less at random, so that what failed together does not come back together.
 *
 * @param attempts made so far, 1 and more
 * @param random from 0 to below 1
 */
export function retryDelay(attempts: number, random = Math.random()): number {
  const plain = Math.min(FIRST * 3 ** (attempts - 1), LONGEST);
  return Math.round(plain * (0.8 + 0.4 * random));
}
