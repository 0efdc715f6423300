import type { RemarkInput } from '$lib/model/team/remarks/remark-input';
import { and, count, eq, gt, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { remark } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { signRemark, type RemarkAuthor, type Signature } from './remark-author';
import { threadFor } from './thread-for';

/** Remarks that one report takes, and one link: a stranger with a link must not fill the disk. */
const MOST = { report: 2000, link: 200 };
/** The same words by the same author within this time are one remark sent twice, milliseconds. */
const TWICE = 120_000;

export type AddRemark =
  /** `again`: it was there already, sent twice; nobody is to be mailed. */
  | { ok: true; id: string; threadId: string; again: boolean }
  /** `unknown`: no such report, thread or link for this author. `settled`: the thread is to be opened first. */
  | { ok: false; reason: 'unknown' | 'not-allowed' | 'name' | 'settled' | 'full' };

/**
 * Adds a remark to a report: the first of a new thread, or an answer. An answer belongs to the section of its thread,
 * whatever the input says.
 */
export function addRemark(
  db: Database,
  author: RemarkAuthor,
  input: RemarkInput & { reportId: string },
  now = Date.now()
): AddRemark {
  const { reportId, threadId, body } = input;
  return db.transaction(
    (tx): AddRemark => {
      const signed = signRemark(tx, author, reportId, now);
      if (!signed.ok) return signed;
      const { signature } = signed;
      const thread = threadId === null ? null : threadFor(tx, reportId, threadId, signature.linkId);
      if (thread === undefined) return { ok: false, reason: 'unknown' };
      const sent = sentBefore(tx, signature, input, now);
      if (sent) return { ok: true, id: sent, threadId: threadId ?? sent, again: true };
      if (thread && thread.settledAt !== null) return { ok: false, reason: 'settled' };
      if (isFull(tx, reportId, signature.linkId)) return { ok: false, reason: 'full' };
      const id = newId();
      const section = thread?.section ?? input.section;
      const { teamId, personId, shownPersonId, linkId, signedAs } = signature;
      tx.insert(remark)
        .values({ id, reportId, section, threadId, body, linkId, personId, signedAs, createdAt: now })
        .run();
      recordEvent(
        tx,
        {
          action: 'remark.add',
          teamId,
          personId: shownPersonId,
          linkId,
          thing: reportId,
          detail: { section }
        },
        signature.shownAt
      );
      return { ok: true, id, threadId: threadId ?? id, again: false };
    },
    { behavior: 'immediate' }
  );
}

function sentBefore(
  db: Pick<Database, 'select'>,
  { personId, linkId, signedAs }: Signature,
  { reportId, threadId, section, body }: RemarkInput & { reportId: string },
  now: number
): string | undefined {
  const same = and(
    eq(remark.reportId, reportId),
    eq(remark.body, body),
    gt(remark.createdAt, now - TWICE),
    threadId === null
      ? and(isNull(remark.threadId), eq(remark.section, section))
      : eq(remark.threadId, threadId),
    linkId === null ? isNull(remark.linkId) : eq(remark.linkId, linkId),
    personId === null
      ? and(isNull(remark.personId), eq(remark.signedAs, signedAs))
      : eq(remark.personId, personId)
  );
  return db.select({ id: remark.id }).from(remark).where(same).get()?.id;
}

function isFull(db: Pick<Database, 'select'>, reportId: string, linkId: string | null): boolean {
  const here = eq(remark.reportId, reportId);
  const number = (where: typeof here | undefined): number =>
    db.select({ n: count() }).from(remark).where(where).get()?.n ?? 0;
  if (number(here) >= MOST.report) return true;
  return linkId !== null && number(and(here, eq(remark.linkId, linkId))) >= MOST.link;
}
