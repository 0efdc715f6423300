import type { Enqueued } from '$lib/server/services/jobs/enqueue-jobs';
import type { Problem } from '../../../../problem';

type Refused = Exclude<Enqueued, { ok: true }> | { ok: false; reason: 'not-failed' | 'ended' };

/** Why no job was queued, or why one could not be cancelled or asked for again. */
export function refusalOf(refused: Refused): Problem {
  switch (refused.reason) {
    case 'unknown':
      return { status: 404, code: 'not-found', title: 'There is nothing at this address.' };
    case 'bad-options':
      return { status: 422, code: 'bad-options', title: refused.why };
    case 'too-many':
      return {
        status: 429,
        code: 'too-many',
        title: `A team may have ${refused.most} diagnoses waiting, and ${refused.queued} wait already. Nothing was added.`
      };
    case 'not-failed':
      return {
        status: 409,
        code: 'not-failed',
        title: 'Only a diagnosis that failed or was cancelled can be asked for again.'
      };
    case 'ended':
      return { status: 409, code: 'ended', title: 'This diagnosis has ended already.' };
  }
}
