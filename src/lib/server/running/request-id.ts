import { randomBytes } from 'node:crypto';

/** Letters that go into a log, a header and an address as they are; short enough to be quoted. */
const WELL_FORMED = /^[\w.-]{8,64}$/;

/**
 * The id of a request: the one a proxy gave it, so that both logs can be searched for it, or a new one of 16 digits.
 *
 * @param given X-Request-Id as it came; anybody may write it, so it counts only behind a proxy
 */
export function requestId(given: string | string[] | undefined, behindProxy: boolean): string {
  if (behindProxy && typeof given === 'string' && WELL_FORMED.test(given)) return given;
  return randomBytes(8).toString('hex');
}
