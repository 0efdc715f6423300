import { cancelJob } from '$lib/server/services/jobs/cancel-job';
import { json } from '@sveltejs/kit';
import { askTeamJson } from '../../../../../../ask-json';
import { answering } from '../../../datasets/answers';
import { afterDeed } from '../../after-deed';
import { refusalOf } from '../../refusals';
import type { RequestHandler } from './$types';

/** Cancels a diagnosis that waits or runs. */
export const POST: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'diagnose');
  if (!asked.ok) return asked.response;
  return answering(() => {
    const result = cancelJob(event.locals.db, asked.actor, event.params.id);
    return afterDeed(event, result.ok ? null : refusalOf(result), () => json({ status: 'cancelled' }));
  });
};
