import { and, eq, lte } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { idempotentAnswer } from '../../db/schema';

/** What was answered: enough to say it again. */
export interface KeptAnswer {
  status: number;
  location: string | null;
  body: string;
}

/** What a piece of work came to: an answer to keep, or a refusal after which the same key is free. */
export type Outcome<Refusal> = { done: KeptAnswer } | { refused: Refusal };

export type Once<Refusal> =
  | { ok: true; answer: KeptAnswer; again: boolean }
  | { ok: false; reason: 'refused'; refusal: Refusal }
  /** The key came before, with another request. */
  | { ok: false; reason: 'other-request' };

/** How long a key is remembered: a day. */
export const REMEMBERED = 24 * 60 * 60 * 1000;

/**
 * Does a piece of work once for each key of a token. The work and the note of its answer are one transaction: a server
 * that dies in between has done neither, and of two processes the second waits and gives the answer of the first.
 * Refusals are not kept: a request that was refused may be mended and sent again under its key.
 *
 * @param fingerprint of the whole request
 * @param work does its own transactions within this one; it must be synchronous
 */
export function once<Refusal>(
  db: Database,
  { tokenId, key, fingerprint }: { tokenId: string; key: string; fingerprint: string },
  work: () => Outcome<Refusal>,
  now = Date.now()
): Once<Refusal> {
  return db.transaction(
    (tx): Once<Refusal> => {
      tx.delete(idempotentAnswer)
        .where(lte(idempotentAnswer.createdAt, now - REMEMBERED))
        .run();
      const same = and(eq(idempotentAnswer.tokenId, tokenId), eq(idempotentAnswer.key, key));
      const before = tx.select().from(idempotentAnswer).where(same).get();
      if (before) {
        if (before.fingerprint !== fingerprint) return { ok: false, reason: 'other-request' };
        const { status, location, body } = before;
        return { ok: true, answer: { status, location, body }, again: true };
      }
      const outcome = work();
      if ('refused' in outcome) return { ok: false, reason: 'refused', refusal: outcome.refused };
      tx.insert(idempotentAnswer)
        .values({ tokenId, key, fingerprint, ...outcome.done, createdAt: now })
        .run();
      return { ok: true, answer: outcome.done, again: false };
    },
    { behavior: 'immediate' }
  );
}
