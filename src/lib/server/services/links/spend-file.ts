import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import { hashToken } from '../../auth/new-token';

/**
 * PDFs and zips made through one link in a minute, by all its readers together: each takes the server half a second. A
 * whole programme committee that opens a link at once stays below it. A restart forgets the count.
 */
export const LINK_FILES = { quota: 30, window: 60 } as const;

export type SpendFile = { ok: true } | { ok: false; reason: 'wait'; seconds: number };

/** Counts files by the token of their link, before it is looked up: a refusal must not use up a visit. */
export function makeFileLimit({ quota, window }: { quota: number; window: number }) {
  const limiter = new RateLimiterMemory({ keyPrefix: 'link-file', points: quota, duration: window });
  return async (token: string): Promise<SpendFile> => {
    try {
      await limiter.consume(hashToken(token));
      return { ok: true };
    } catch (refused) {
      if (!(refused instanceof RateLimiterRes)) throw refused;
      return { ok: false, reason: 'wait', seconds: Math.max(1, Math.ceil(refused.msBeforeNext / 1000)) };
    }
  };
}

/** Counts one file and says when it is one too many. */
export const spendFile = makeFileLimit(LINK_FILES);
