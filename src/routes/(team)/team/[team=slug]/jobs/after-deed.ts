import { error, redirect, type RequestEvent } from '@sveltejs/kit';
import { problem, type Problem } from '../../../../problem';

/** Whether a page's own form asked, and not a script. */
const fromPage = (event: RequestEvent) => event.request.headers.get('accept')?.includes('text/html') ?? false;

/**
 * The answer to a button of one job. A form goes back to the jobs, which show how things are; where there is nothing
 * to do any more (the job ended a moment before) as well. A script gets JSON or problem details.
 */
export function afterDeed(event: RequestEvent, refused: Problem | null, done: () => Response): Response {
  if (!fromPage(event)) return refused ? problem(refused) : done();
  if (refused && refused.status !== 409)
    error(refused.status, { message: refused.title, code: refused.code });
  redirect(303, `/team/${event.params.team}/jobs`);
}
