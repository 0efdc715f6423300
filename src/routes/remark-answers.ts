import { remarkInputSchema, settleSchema } from '$lib/model/team/remarks/remark-input';
import { addRemark } from '$lib/server/services/remarks/add-remark';
import { mailRemark } from '$lib/server/services/remarks/mail-remark';
import type { RemarkAuthor } from '$lib/server/services/remarks/remark-author';
import { giveBackRemark, spendRemark, type LinkReader } from '$lib/server/services/remarks/spend-remark';
import { settleThread } from '$lib/server/services/remarks/settle-thread';
import { storageTrouble } from '$lib/server/services/datasets/storage-trouble';
import type { Problem } from './problem';

/** Where a remark is made: the report, by whom, and the address of the report's page for members. */
export interface RemarkPlace {
  db: App.Locals['db'];
  author: RemarkAuthor;
  reportId: string;
  address: string;
  /** Who of a link's readers it is; absent for members. */
  from?: LinkReader;
}

export type Answered<Given> = ({ ok: true } & Given) | { ok: false; problem: Problem };

const PROBLEMS: Record<
  'unknown' | 'not-allowed' | 'name' | 'settled' | 'full' | 'wait' | 'busy' | 'disk-full',
  Problem
> = {
  unknown: { status: 404, code: 'not-found', title: 'There is no such report or thread any more.' },
  'not-allowed': { status: 403, code: 'not-allowed', title: 'You may not remark on this report.' },
  name: {
    status: 400,
    code: 'name',
    title:
      'This cannot be signed with that name. Sign with another of at most 80 characters; if you are signed in, the name of your account counts.'
  },
  settled: {
    status: 409,
    code: 'settled',
    title: 'This thread was settled meanwhile. Open it again to answer; your text is still here.'
  },
  full: { status: 409, code: 'full', title: 'This report takes no more remarks.' },
  wait: {
    status: 429,
    code: 'wait',
    title: 'These are many remarks for one hour. Your text is still here; send it later.'
  },
  busy: {
    status: 503,
    code: 'busy',
    title: 'The database is busy. Nothing was saved; try again in a moment.'
  },
  'disk-full': {
    status: 507,
    code: 'full',
    title: 'The disk of the server is full. Nothing was saved; tell who runs it.'
  }
};

/** Reads a remark from what was sent, keeps it and mails about it; or says what is wrong with it. */
export async function takeRemark(
  { db, author, reportId, address, from }: RemarkPlace,
  sent: unknown
): Promise<Answered<{ id: string; threadId: string; again: boolean; missed: number }>> {
  const read = remarkInputSchema.safeParse(sent);
  if (!read.success) {
    const [{ message }] = read.error.issues;
    return { ok: false, problem: { status: 400, code: 'bad-input', title: message } };
  }
  const spent = from ? await spendRemark(from) : { ok: true as const };
  if (!spent.ok) return { ok: false, problem: PROBLEMS[spent.reason] };
  const added = writing(() => addRemark(db, author, { ...read.data, reportId }));
  if (from && (!added.ok || added.again)) await giveBackRemark(from);
  if (!added.ok) return { ok: false, problem: PROBLEMS[added.reason] };
  const missed = added.again ? 0 : await mailRemark(db, added.id, address);
  return { ...added, missed };
}

/** Settles a thread or opens it again. */
export function takeSettling(
  { db, author, reportId }: Omit<RemarkPlace, 'address'>,
  threadId: string,
  sent: unknown
): Answered<{ changed: boolean }> {
  const read = settleSchema.safeParse(sent);
  if (!read.success)
    return { ok: false, problem: { status: 400, code: 'bad-input', title: 'Say whether it is settled.' } };
  const done = writing(() => settleThread(db, author, { reportId, threadId, settled: read.data.settled }));
  return done.ok ? done : { ok: false, problem: PROBLEMS[done.reason] };
}

/** What a service answers, or the trouble of the disk below it. */
function writing<Answer>(work: () => Answer): Answer | { ok: false; reason: 'busy' | 'disk-full' } {
  try {
    return work();
  } catch (error) {
    const trouble = storageTrouble(error);
    if (!trouble) throw error;
    return { ok: false, reason: trouble === 'full' ? 'disk-full' : 'busy' };
  }
}
