import { jobStream } from '$lib/server/services/jobs/job-stream';
import { askTeamJson } from '../../../../../ask-json';
import type { RequestHandler } from './$types';

/** What happens to the team's jobs, as server-sent events; see jobStream. */
export const GET: RequestHandler = (event) => {
  const asked = askTeamJson(event, 'see');
  if (!asked.ok) return asked.response;
  return new Response(jobStream(event.locals.db, asked.actor, event.request.signal), {
    headers: {
      'content-type': 'text/event-stream',
      'cache-control': 'no-store',
      // A proxy that buffers would keep every event to itself.
      'x-accel-buffering': 'no'
    }
  });
};
