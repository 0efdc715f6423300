import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';

const HOUR = 3600;

/**
 * Remarks in an hour, of one reader of a link and of all its readers together: cookies are thrown away easily. Common
 * practice, no source: a referee who objects to every section of a report writes ten remarks. A restart forgets them.
 */
const limiters = {
  reader: new RateLimiterMemory({ keyPrefix: 'remark-reader', points: 10, duration: HOUR }),
  link: new RateLimiterMemory({ keyPrefix: 'remark-link', points: 60, duration: HOUR })
};

/** Who remarks by a link: the account of whoever is signed in, or the visit that their browser keeps. */
export interface LinkReader {
  linkId: string;
  reader: string;
}

const keyOf = (by: 'reader' | 'link', { linkId, reader }: LinkReader): string =>
  by === 'link' ? linkId : `${linkId} ${reader}`;

/** Counts a remark by a link before it is kept. @returns whether it is one too many */
export async function spendRemark(from: LinkReader): Promise<{ ok: true } | { ok: false; reason: 'wait' }> {
  for (const by of ['reader', 'link'] as const) {
    try {
      await limiters[by].consume(keyOf(by, from));
    } catch (refused) {
      if (!(refused instanceof RateLimiterRes)) throw refused;
      return { ok: false, reason: 'wait' };
    }
  }
  return { ok: true };
}

/** A remark that was not kept after all counts for nothing. */
export async function giveBackRemark(from: LinkReader): Promise<void> {
  for (const by of ['reader', 'link'] as const) await limiters[by].reward(keyOf(by, from));
}
