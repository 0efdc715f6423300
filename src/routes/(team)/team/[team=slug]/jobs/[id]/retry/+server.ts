import { retryJob } from '$lib/server/services/jobs/retry-job';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../../ask-json';
import { answering } from '../../../datasets/answers';
import { afterDeed } from '../../after-deed';
import { refusalOf } from '../../refusals';
import type { RequestHandler } from './$types';

/** Asks once more for a diagnosis that failed or was cancelled: a new job. */
export const POST: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'diagnose');
  if (!asked.ok) return asked.response;
  return answering(() => {
    const result = retryJob(event.locals.db, asked.actor, event.params.id);
    const jobs = result.ok ? result.jobs : [];
    return afterDeed(event, result.ok ? null : refusalOf(result), () => json({ jobs }, { status: 202 }));
  });
};
